using NodaTime;

namespace UnitVent.Charting.Trends;

/// <summary>A value against what it was before: the median of the valid values of the hours before it.</summary>
/// <param name="Before">The reference: the median of the earlier values.</param>
/// <param name="After">The value.</param>
/// <param name="Count">How many earlier values there were.</param>
/// <param name="Span">The time from the first earlier value to the value.</param>
public sealed record Step(double Before, double After, int Count, Duration Span)
{
    /// <summary>How far back the reference reaches [common practice].</summary>
    public static readonly Duration Reach = Duration.FromHours(12);

    /// <summary>Gets the change relative to the reference, of a quantity above zero: −0.20 is a fall by a fifth.</summary>
    public double RelativeChange => (After - Before) / Before;

    /// <summary>The step of a value; null when no earlier value lies within reach.</summary>
    /// <param name="earlier">The valid earlier values in any order.</param>
    /// <param name="latest">The value.</param>
    public static Step? Of(IEnumerable<SeriesPoint> earlier, SeriesPoint latest)
    {
        var within = earlier.Where(p => p.At < latest.At && latest.At - p.At <= Reach).OrderBy(p => p.At).ToList();
        return within.Count == 0 ? null : new(Median(within), latest.Value, within.Count, latest.At - within[0].At);
    }

    private static double Median(List<SeriesPoint> points) => MathNet.Numerics.Statistics.Statistics.Median(points.Select(p => p.Value));
}
