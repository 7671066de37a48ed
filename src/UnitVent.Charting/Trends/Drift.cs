using MathNet.Numerics.Statistics;
using NodaTime;

namespace UnitVent.Charting.Trends;

/// <summary>Whether a quantity drifts: it moves one way more than by chance, and by as much as matters.</summary>
/// <remarks>
/// <para>Enough data: four points over four hours. Direction: <see cref="MannKendall"/> with two-sided p ≤ 0.10. Size: the <see cref="TheilSen"/> slope times the
/// span reaches the smallest change that matters from the starting median on. Both make a drift; nothing is extrapolated [common practice].</para>
/// <para>Expect chance: with gases every four hours that vary by 5 % about one in a hundred stable series is called a drift, with 9.8 % about one in twenty.</para>
/// </remarks>
public sealed record Drift
{
    /// <summary>The fewest points of a verdict.</summary>
    public const int FewestPoints = 4;

    /// <summary>The largest two-sided probability at which a movement counts.</summary>
    public const double Level = 0.10;

    /// <summary>The shortest time between first and last point of a verdict.</summary>
    public static readonly Duration ShortestSpan = Duration.FromHours(4);

    private const int StartingPoints = 3;
    private const double RoundingSlack = 1e-9;

    private Drift(DriftVariable variable, IReadOnlyList<SeriesPoint> points)
    {
        (Variable, Points) = (variable, points);
        if (points.Count < FewestPoints || Span < ShortestSpan)
        {
            return;
        }

        double[] hours = [.. points.Select(p => (p.At - points[0].At).TotalHours)];
        double[] values = [.. points.Select(p => p.Value)];
        Line = TheilSen.Of(hours, values, 1 - Level);
        Trend = MannKendall.Of(values);
        Jump = Step.Of(points.SkipLast(1), points[^1]) is { } step && Math.Abs(step.After - step.Before) >= variable.StepMinimum.From(step.Before) - RoundingSlack ? step : null;
        Verdict = Trend.P > Level ? (Jump is null ? DriftVerdict.None : DriftVerdict.Jump)
            : Math.Abs(Change!.Value) >= variable.TrendMinimum.From(StartMedian!.Value) - RoundingSlack ? DriftVerdict.Drifting
            : DriftVerdict.SteadySmallChange;
    }

    /// <summary>Gets the quantity.</summary>
    public DriftVariable Variable { get; }

    /// <summary>Gets the points that count, oldest first.</summary>
    public IReadOnlyList<SeriesPoint> Points { get; }

    /// <summary>Gets the verdict.</summary>
    public DriftVerdict Verdict { get; }

    /// <summary>Gets how many points count.</summary>
    public int Count => Points.Count;

    /// <summary>Gets the time from the first point to the last; none without two.</summary>
    public Duration Span => Points.Count == 0 ? Duration.Zero : Points[^1].At - Points[0].At;

    /// <summary>Gets the line through the points, hour 0 at the first, with its 90 % interval; null without enough data.</summary>
    public TheilSen? Line { get; }

    /// <summary>Gets the test for a movement one way; null without enough data.</summary>
    public MannKendall? Trend { get; }

    /// <summary>Gets the step of the last point against the median of the 12 h before it, when it is as large as matters for a step; null when it is not.</summary>
    public Step? Jump { get; }

    /// <summary>Gets the change over the span by the line, in the unit of the quantity; null without enough data.</summary>
    public double? Change => Line?.SlopePerHour * Span.TotalHours;

    /// <summary>Gets where it started: the median of the first three points; null without enough data.</summary>
    public double? StartMedian => Line is null ? null : Points.Take(StartingPoints).Select(p => p.Value).Median();

    /// <summary>Gets which way it moves.</summary>
    public DriftDirection Direction => Verdict is DriftVerdict.NotEnoughData or DriftVerdict.None ? DriftDirection.Level
        : (Verdict == DriftVerdict.Jump ? Jump!.After - Jump.Before : Trend!.Score) > 0 ? DriftDirection.Up
        : DriftDirection.Down;

    /// <summary>Gets what the movement means.</summary>
    public DriftCourse Course => Direction == DriftDirection.Level ? DriftCourse.Level
        : Variable.Worse == WorseWhen.Either ? DriftCourse.Either
        : (Verdict == DriftVerdict.Jump ? Variable.Worsening(Jump!.Before, Jump.After) : Variable.Worsening(Line!.Intercept, Line.Intercept + Change!.Value)) > 0 ? DriftCourse.Worse
        : DriftCourse.Better;

    /// <summary>Gets how much data the verdict rests on; null without enough.</summary>
    public DriftConfidence? Confidence => Line is null ? null
        : Count <= 5 ? DriftConfidence.Early
        : Count <= 8 ? DriftConfidence.Moderate
        : DriftConfidence.Firm;

    /// <summary>The verdict on a series. Of points less than 30 min apart the latest stands.</summary>
    /// <param name="series">The valid values of one epoch, in any order; of two at the same time the later in the list stands.</param>
    /// <param name="variable">The quantity.</param>
    /// <exception cref="ArgumentOutOfRangeException">There is enough data, and a value is not finite.</exception>
    public static Drift Of(IEnumerable<SeriesPoint> series, DriftVariable variable) => new(variable, Repeats.Dropped(series));

    /// <summary>Whether the last two values are no worse than a start by more than half of what matters: what was called a drift from there is over.</summary>
    /// <param name="startMedian">The <see cref="StartMedian"/> of the drift that was called.</param>
    public bool IsBackInside(double startMedian) =>
        Count >= 2 && Points.TakeLast(2).All(p => Variable.Worsening(startMedian, p.Value) <= Variable.TrendMinimum.From(startMedian) / 2 + RoundingSlack);
}
