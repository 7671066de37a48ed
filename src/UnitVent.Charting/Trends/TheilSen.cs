using System.Buffers;
using MathNet.Numerics.Distributions;
using MathNet.Numerics.Statistics;

namespace UnitVent.Charting.Trends;

/// <summary>The line through irregular points by the median of all pairwise slopes, and how far its slope is known.</summary>
/// <remarks>
/// <para>Slopes (yⱼ − yᵢ) ÷ (tⱼ − tᵢ) of the pairs with tⱼ &gt; tᵢ; pairs at the same time are dropped. The slope is their median, the intercept the median of y − slope t.</para>
/// <para>Interval: of N slopes in ascending order the (N − K) ÷ 2-th to the (N + K) ÷ 2 + 1-th. Up to 12 points without equal times or values K is exact: two less
/// than the smallest Kendall score whose tail is at most half of what the confidence leaves. Else K = z √[n(n − 1)(2n + 5) ÷ 18], both ranks to the nearest whole.</para>
/// <para>Source: Theil H. Proc K Ned Akad Wet A 1950;53:386-392 [from memory]. Sen PK. J Am Stat Assoc 1968;63:1379-1389. Hollander M, Wolfe DA, Chicken E. Nonparametric
/// Statistical Methods, 3rd ed. 2014, section 9.3 [from memory].</para>
/// </remarks>
/// <param name="SlopePerHour">The slope, in units of the value per hour.</param>
/// <param name="Intercept">The line's value at hour 0.</param>
/// <param name="LowestPerHour">The lower end of the interval, no larger than the slope.</param>
/// <param name="HighestPerHour">The upper end of the interval, no smaller than the slope.</param>
/// <param name="IsRange">Whether no interval shorter than the full range of slopes has the confidence asked for: then it is that range.</param>
public sealed record TheilSen(double SlopePerHour, double Intercept, double LowestPerHour, double HighestPerHour, bool IsRange)
{
    private const int MostForExactInterval = 12;

    /// <summary>The line; null when there are not two points at different times.</summary>
    /// <param name="hours">The times in hours from any zero, in any order.</param>
    /// <param name="values">The values, one a time.</param>
    /// <param name="confidence">The confidence of the interval, in (0, 1).</param>
    /// <exception cref="ArgumentException">There are not as many values as times.</exception>
    /// <exception cref="ArgumentOutOfRangeException">A number is not finite, or the confidence is not in (0, 1).</exception>
    public static TheilSen? Of(ReadOnlySpan<double> hours, ReadOnlySpan<double> values, double confidence = 0.90)
    {
        ArgumentOutOfRangeException.ThrowIfNegativeOrZero(confidence);
        ArgumentOutOfRangeException.ThrowIfGreaterThanOrEqual(confidence, 1);
        ArgumentOutOfRangeException.ThrowIfNotEqual(values.Length, hours.Length);
        Finite.Ensure(hours);
        Finite.Ensure(values);
        var slopes = ArrayPool<double>.Shared.Rent(hours.Length * (hours.Length - 1) / 2);
        try
        {
            var count = Slopes(hours, values, slopes);
            return count == 0 ? null : Line(hours, values, slopes, count, confidence);
        }
        finally
        {
            ArrayPool<double>.Shared.Return(slopes);
        }
    }

    private static TheilSen Line(ReadOnlySpan<double> hours, ReadOnlySpan<double> values, double[] slopes, int count, double confidence)
    {
        var slope = (Ranked((count + 1) / 2) + Ranked((count + 2) / 2)) / 2;
        var (lower, upper) = Ranks(hours, values, count, confidence);
        return new(slope, LevelAtZero(hours, values, slope), Ranked(lower), Ranked(upper), lower == 1 && upper == count);

        double Ranked(int rank) => ArrayStatistics.OrderStatisticInplace(slopes, rank);
    }

    /// <summary>Fills in the slopes and says how many there are; what is left of the room is above them all.</summary>
    private static int Slopes(ReadOnlySpan<double> hours, ReadOnlySpan<double> values, double[] slopes)
    {
        var count = 0;
        for (var i = 0; i < hours.Length; i++)
        {
            for (var j = i + 1; j < hours.Length; j++)
            {
                if (hours[j] != hours[i])
                {
                    slopes[count++] = (values[j] - values[i]) / (hours[j] - hours[i]);
                }
            }
        }

        slopes.AsSpan(count).Fill(double.PositiveInfinity);
        return count;
    }

    private static double LevelAtZero(ReadOnlySpan<double> hours, ReadOnlySpan<double> values, double slope)
    {
        var levels = new double[values.Length];
        for (var i = 0; i < levels.Length; i++)
        {
            levels[i] = values[i] - slope * hours[i];
        }

        return ArrayStatistics.MedianInplace(levels);
    }

    private static (int Lower, int Upper) Ranks(ReadOnlySpan<double> hours, ReadOnlySpan<double> values, int slopes, double confidence)
    {
        var (n, tail) = (hours.Length, (1 - confidence) / 2);
        var k = n <= MostForExactInterval && AllDiffer(hours) && AllDiffer(values)
            ? KendallScores.Smallest(n, tail) - 2 ?? slopes
            : Normal.InvCDF(0, 1, 1 - tail) * Math.Sqrt((double)n * (n - 1) * (2 * n + 5) / 18);
        return (Math.Clamp(Nearest((slopes - k) / 2), 1, slopes), Math.Clamp(Nearest((slopes + k) / 2 + 1), 1, slopes));
    }

    private static int Nearest(double rank) => (int)Math.Round(rank, MidpointRounding.AwayFromZero);

    private static bool AllDiffer(ReadOnlySpan<double> numbers)
    {
        for (var i = 1; i < numbers.Length; i++)
        {
            if (numbers[..i].Contains(numbers[i]))
            {
                return false;
            }
        }

        return true;
    }
}
