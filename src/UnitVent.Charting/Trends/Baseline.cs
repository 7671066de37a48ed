using MathNet.Numerics.Statistics;

namespace UnitVent.Charting.Trends;

/// <summary>What dense readings are held against: level and spread of the first readings of an epoch [common practice].</summary>
/// <param name="Target">Their mean.</param>
/// <param name="Sigma">Their standard deviation, with n − 1.</param>
public sealed record Baseline(double Target, double Sigma)
{
    /// <summary>How many readings it takes.</summary>
    public const int Readings = 6;

    /// <summary>The baseline of readings, oldest first; null when there are fewer than six.</summary>
    /// <param name="readings">The readings of one epoch; only the first six count.</param>
    /// <exception cref="ArgumentOutOfRangeException">One of the first six is not finite.</exception>
    public static Baseline? Of(ReadOnlySpan<double> readings)
    {
        if (readings.Length < Readings)
        {
            return null;
        }

        var first = readings[..Readings].ToArray();
        Finite.Ensure(first, nameof(readings));
        return new(first.Mean(), first.StandardDeviation());
    }
}
