using CsCheck;
using UnitVent.Charting.Trends;

namespace UnitVent.Charting.Tests.Trends;

public sealed class TheilSenTests
{
    private static readonly Gen<(double[] Hours, double[] Values)> Series =
        Gen.Select(Gen.Int[0, 24].Array[2, 30], Gen.Int[0, 64].Array[30]).Select((steps, values) =>
            (Hours(steps), values[..steps.Length].Select(v => v / 4.0).ToArray()));

    /// <summary>Times, values, confidence, slope, lower and upper end; the source is in the last column.</summary>
    public static TheoryData<double[], double[], double, double, double, double, string> PublishedLines => new()
    {
        {
            [67, 28, 30, 28, 52, 40, 25, 37, 44, 10, 14, 20, 28, 40, 51], [21, 4, 9, 12, 35, 18, 10, 22, 24, 1, 6, 8, 13, 16, 19],
            .95, .5, .3243243, .75, "Hollander, Wolfe: an example of statistics packages; 101 slopes, ranks 31 and 71"
        },
        { [1, 2, 3, 4, 5], [1.26, 1.27, 1.12, 1.16, 1.03], .90, -.05625, -.13, .01, "Hollander, Wolfe, Chicken 2014, example 9.1" },
        { [0, 4, 7.5, 12, 16, 22], [212, 205, 198, 186, 180, 166], .90, -2.0909, -2.3333, -1.8667, "irregular times, exact ranks 4 and 12 of 15 by hand" },
        { [0, 3, 6, 10, 14], [44, 46, 45, 49, 52], .90, .5584, .1667, .8750, "exact ranks 2 and 9 of 10 by hand" },
    };

    [Theory, MemberData(nameof(PublishedLines))]
    public void Line_OfAPublishedExample_IsThePublishedOne(double[] hours, double[] values, double confidence, double slope, double lower, double upper, string source)
    {
        var line = TheilSen.Of(hours, values, confidence)!;

        Assert.False(line.IsRange, source);
        Assert.Equal(slope, line.SlopePerHour, 5e-5);
        Assert.Equal(lower, line.LowestPerHour, 5e-5);
        Assert.Equal(upper, line.HighestPerHour, 5e-5);
    }

    /// <summary>Slope by hand: of 180 176 186 172 181 every four hours, the median of −1, .75, −.667, .0625, 2.5, −.5, .417, −3.5, −.625, 2.25; and 1.125 of US EPA QA/G-9 [from memory].</summary>
    [Fact]
    public void Slope_ByHand_IsTheMedianOfThePairs()
    {
        Assert.Equal(-.219, TheilSen.Of([0, 4, 8, 12, 16], [180, 176, 186, 172, 181])!.SlopePerHour, 3);
        Assert.Equal(1.125, TheilSen.Of([1, 2, 3, 4, 5], [5, 6, 11, 8, 10])!.SlopePerHour);
    }

    [Fact]
    public void Interval_OfFourPoints_IsTheRangeOfSlopes()
    {
        var line = TheilSen.Of([0, 4, 8, 12], [200, 190, 185, 165])!;

        Assert.Equal((-5, -1.25, true), (line.LowestPerHour, line.HighestPerHour, line.IsRange));
    }

    [Fact]
    public void Line_WithoutTwoTimes_IsNone()
    {
        Assert.Null(TheilSen.Of([], []));
        Assert.Null(TheilSen.Of([1], [7]));
        Assert.Null(TheilSen.Of([1, 1, 1], [7, 8, 9]));
    }

    [Fact]
    public void Line_OfWhatIsNoSeries_IsRefused()
    {
        Assert.Throws<ArgumentOutOfRangeException>(() => TheilSen.Of([1, 2], [7]));
        Assert.Throws<ArgumentOutOfRangeException>(() => TheilSen.Of([1, double.NaN], [7, 8]));
        Assert.Throws<ArgumentOutOfRangeException>(() => TheilSen.Of([1, 2], [7, double.NegativeInfinity]));
        Assert.Throws<ArgumentOutOfRangeException>(() => TheilSen.Of([1, 2], [7, 8], 1));
    }

    [Fact]
    public void Line_ShiftedScaledOrReversed_ShiftsScalesAndReverses() => Gen.Select(Series, Gen.Int[-50, 50], Gen.Int[1, 8]).Sample((series, shift, scale) =>
    {
        var line = TheilSen.Of(series.Hours, series.Values)!;
        var moved = TheilSen.Of([.. series.Hours.Select(h => h + shift)], [.. series.Values.Select(v => v * scale + shift)])!;
        var reversed = TheilSen.Of([.. series.Hours.Select(h => -h)], series.Values)!;

        Assert.InRange(line.SlopePerHour, line.LowestPerHour, line.HighestPerHour);
        Close(line.SlopePerHour * scale, moved.SlopePerHour);
        Close(line.LowestPerHour * scale, moved.LowestPerHour);
        Close(line.HighestPerHour * scale, moved.HighestPerHour);
        Close(line.Intercept * scale + shift - line.SlopePerHour * scale * shift, moved.Intercept);
        Close(-line.SlopePerHour, reversed.SlopePerHour);
        Close(line.Intercept, reversed.Intercept);
    });

    /// <summary>Where the counted form ends and the normal form begins, both give the same score.</summary>
    [Fact]
    public void Interval_AtTwelvePoints_AgreesWithItsNormalForm()
    {
        Assert.Equal(24, KendallScores.Smallest(12, 0.05) - 2);
        Assert.Equal(24, 1.645 * Math.Sqrt(12 * 11 * 29 / 18.0), 0.05);
    }

    [Fact]
    public void Line_ThroughPointsOnALine_IsThatLine() => Gen.Select(Gen.Int[0, 24].Array[2, 40], Gen.Double[-9, 9], Gen.Double[-99, 99]).Sample((steps, slope, level) =>
    {
        var hours = Hours(steps);
        var line = TheilSen.Of(hours, [.. hours.Select(h => level + slope * h)])!;

        Close(slope, line.SlopePerHour);
        Close(level, line.Intercept);
    });

    /// <summary>Times in quarter hours from the steps between them, so that all differ.</summary>
    private static double[] Hours(int[] steps)
    {
        var at = 0;
        return [.. steps.Select(s => (at += s + 1) / 4.0)];
    }

    private static void Close(double expected, double actual) => Assert.Equal(expected, actual, 1e-9 * Math.Max(1, Math.Abs(expected)));
}
