using UnitVent.Charting.Trends;

namespace UnitVent.Charting.Tests.Trends;

public sealed class ControlChartTests
{
    /// <summary>Montgomery DC. Introduction to Statistical Quality Control, table 9.1: target 10, sigma 1.</summary>
    private static readonly double[] Montgomery =
    [
        9.45, 7.99, 9.29, 11.66, 12.16, 10.18, 8.04, 11.46, 9.20, 10.34, 9.03, 11.47, 10.51, 9.40, 10.08,
        9.37, 10.62, 10.31, 8.52, 10.84, 10.90, 9.33, 12.29, 11.50, 10.60, 11.08, 10.38, 11.62, 11.31, 10.52,
    ];

    /// <summary>NIST/SEMATECH e-Handbook of Statistical Methods, section 6.3.2.4.</summary>
    [Fact]
    public void Ewma_OfTheNistExample_IsThePrintedSeries()
    {
        var ewma = Ewma.Of([52.0, 47.0, 53.0, 49.3, 50.1, 47.0, 51.0, 50.1, 51.2, 50.5, 49.6, 47.6, 49.9, 51.3, 47.8, 51.2, 52.6, 52.4, 53.6, 52.1], 50, 2.0539);

        Assert.Equal(
            [50.60, 49.52, 50.56, 50.18, 50.16, 49.21, 49.75, 49.85, 50.26, 50.33, 50.11, 49.36, 49.52, 50.05, 49.38, 49.92, 50.73, 51.23, 51.94, 51.99],
            ewma.Averages.Select(z => Math.Round(z, 2)));
        Assert.Equal(52.5884, ewma.Upper, 4);
        Assert.Equal(47.4115, ewma.Lower, 3);
        Assert.Null(ewma.FirstOutside);
    }

    /// <summary>Montgomery, table 9.1 with λ 0.1 and L 2.7: the limit, 10.6194, is that for many readings; the 29th average is the first beyond.</summary>
    [Fact]
    public void Ewma_OfTheMontgomeryExample_CrossesAtTheTwentyNinth()
    {
        var ewma = Ewma.Of(Montgomery, 10, 1, 0.1, 2.7);

        Assert.Equal([9.945, 9.7495, 10.5731, 10.6468], new[] { 0, 1, 27, 28 }.Select(i => Math.Round(ewma.Averages[i], 4)));
        Assert.Equal(10 + 2.7 * Math.Sqrt(0.1 / 1.9), ewma.Upper, 12);
        Assert.Equal(28, ewma.FirstOutside);
    }

    /// <summary>NIST/SEMATECH e-Handbook of Statistical Methods, section 6.3.2.3.</summary>
    [Fact]
    public void Cusum_OfTheNistExample_IsThePrintedSeries()
    {
        var cusum = Cusum.Of(
            [324.925, 324.675, 324.725, 324.350, 325.350, 325.225, 324.125, 324.525, 325.225, 324.600,
             324.625, 325.150, 328.325, 327.250, 327.825, 328.500, 326.675, 327.775, 326.875, 328.350],
            325, 0.3175, 4.1959);

        double[] printed = [3.01, 4.94, 7.45, 10.63, 11.99, 14.44, 16.00, 19.04];
        Assert.All(printed.Zip(cusum.High.Skip(12)), pair => Assert.Equal(pair.First, pair.Second, 0.0051));
        Assert.Equal([0.56, 0.72], cusum.Low.Skip(6).Take(2).Select(low => Math.Round(low, 2)));
        Assert.Equal(13, cusum.FirstSignal);
    }

    /// <summary>Montgomery, table 9.2 (K 0.5, H 5): the 29th sum, 5.28, is the first beyond [the printed 5.28 from memory].</summary>
    [Fact]
    public void Cusum_OfTheMontgomeryExample_SignalsAtTheTwentyNinth()
    {
        var cusum = Cusum.Of(Montgomery, 10, 0.5, 5);

        Assert.Equal([3.35, 4.47, 5.28, 5.30], cusum.High.Skip(26).Select(high => Math.Round(high, 2)));
        Assert.Equal(28, cusum.FirstSignal);
    }

    [Fact]
    public void Charts_OfNoReadings_AreEmpty()
    {
        Assert.Empty(Ewma.Of([], 50, 2).Averages);
        Assert.Null(Cusum.Of([], 50, 1, 4).FirstSignal);
    }

    [Fact]
    public void Charts_OfWhatCannotBe_AreRefused()
    {
        Assert.Throws<ArgumentOutOfRangeException>(() => Ewma.Of([50, double.NaN], 50, 2));
        Assert.Throws<ArgumentOutOfRangeException>(() => Ewma.Of([50], 50, -1));
        Assert.Throws<ArgumentOutOfRangeException>(() => Ewma.Of([50], 50, 2, 0));
        Assert.Throws<ArgumentOutOfRangeException>(() => Ewma.Of([50], 50, 2, 1.1));
        Assert.Throws<ArgumentOutOfRangeException>(() => Cusum.Of([50], double.NaN, 1, 4));
        Assert.Throws<ArgumentOutOfRangeException>(() => Cusum.Of([50], 50, -1, 4));
    }

    [Fact]
    public void Baseline_TakesTheFirstSix()
    {
        Assert.Null(Baseline.Of([2, 4, 4, 4, 5]));

        // Mean 24 ÷ 6 and squares 4 + 0 + 0 + 0 + 1 + 1 over n − 1 = 5, by hand.
        var baseline = Baseline.Of([2, 4, 4, 4, 5, 5, 99])!;
        Assert.Equal(4, baseline.Target, 12);
        Assert.Equal(Math.Sqrt(6 / 5.0), baseline.Sigma, 12);
    }
}
