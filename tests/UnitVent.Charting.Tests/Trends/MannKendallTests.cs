using CsCheck;
using MathNet.Numerics.Distributions;
using UnitVent.Charting.Trends;

namespace UnitVent.Charting.Tests.Trends;

public sealed class MannKendallTests
{
    private static readonly Gen<double[]> Values = Gen.Int[0, 40].Select(i => i / 4.0).Array[2, 45];

    /// <summary>Score, variance and exact two-sided probability; the source is in the last column.</summary>
    public static TheoryData<double[], int, double, double, string> PublishedExamples => new()
    {
        { [1.26, 1.27, 1.12, 1.16, 1.03], -6, 16.667, .2333, "Hollander, Wolfe, Chicken 2014, example 9.1: one-sided .1167" },
        { [5, 6, 11, 8, 10], 6, 16.667, .2333, "US EPA QA/G-9, trend example [from memory]: one-sided .117" },
        { [212, 205, 198, 186, 180, 166], -15, 28.333, .0028, "one order of 720, both ends" },
        { [44, 46, 45, 49, 52], 8, 16.667, .0833, "five of 120 orders, both ends" },
        { [180, 176, 186, 172, 181], 0, 16.667, 1, "as many pairs rise as fall" },
        { [20, 20, 22, 25], 5, 7.667, .1667, "one pair tied: 1 of 12 orders, both ends" },
        { [10, 12, 12, 14, 13], 7, 15.667, .1333, "one pair tied: 4 of 60 orders, both ends" },
        { [7.30, 7.30, 7.28, 7.25, 7.25], -8, 14.667, .0667, "two pairs tied: 1 of 30 orders, both ends" },
    };

    [Theory, MemberData(nameof(PublishedExamples))]
    public void Test_OfAPublishedExample_IsThePublishedOne(double[] values, int score, double variance, double p, string source)
    {
        var test = MannKendall.Of(values);

        Assert.True(score == test.Score, source);
        Assert.Equal(variance, test.Variance, 3);
        Assert.Equal(p, test.P, 4);
    }

    [Theory]
    [InlineData(new double[] { })]
    [InlineData(new double[] { 7 })]
    [InlineData(new double[] { 7, 7, 7, 7 })]
    public void Test_OfValuesThatSayNothing_IsOne(double[] values) => Assert.Equal((0, 1), (MannKendall.Of(values).Score, MannKendall.Of(values).P));

    [Theory]
    [InlineData(double.NaN)]
    [InlineData(double.PositiveInfinity)]
    public void Test_OfWhatIsNoNumber_IsRefused(double value) => Assert.Throws<ArgumentOutOfRangeException>(() => MannKendall.Of([1, value, 3]));

    [Fact]
    public void Test_OfValuesShiftedScaledOrReversed_SaysTheSame() => Gen.Select(Values, Gen.Int[-50, 50], Gen.Int[1, 8]).Sample((values, shift, scale) =>
    {
        var test = MannKendall.Of(values);

        AssertSame(test, MannKendall.Of([.. values.Select(v => v * scale + shift)]));
        AssertSame(test with { Score = -test.Score }, MannKendall.Of([.. values.Select(v => -v)]));
        AssertSame(test with { Score = -test.Score }, MannKendall.Of([.. values.Reverse()]));
        Assert.InRange(test.P, double.Epsilon, 1);
    });

    /// <summary>At thirty values the counted probability and the normal law with its continuity correction lie within 0.01 of each other, ties or not.</summary>
    [Fact]
    public void Test_OfThirtyValues_AgreesWithTheNormalLaw() => Gen.Int[0, 12].Array[30].Sample(whole =>
    {
        var test = MannKendall.Of([.. whole.Select(w => (double)w)]);
        var z = Math.Max(0, Math.Abs(test.Score) - 1) / Math.Sqrt(test.Variance);

        Assert.Equal(2 * Normal.CDF(0, 1, -z), test.P, 0.01);
    });

    [Fact]
    public void Test_BeyondThirtyValues_IsTheNormalLaw()
    {
        var test = MannKendall.Of([.. Enumerable.Range(0, 40).Select(i => i + 15 * Math.Sin(i * 2.4))]);

        Assert.Equal(2 * Normal.CDF(0, 1, (1 - test.Score) / Math.Sqrt(test.Variance)), test.P, 12);
        Assert.Equal(40 * 39 * 85 / 18.0, test.Variance, 9);
    }

    private static void AssertSame(MannKendall expected, MannKendall actual)
    {
        Assert.Equal((expected.Score, expected.Variance), (actual.Score, actual.Variance));
        Assert.Equal(expected.P, actual.P, 12);
    }
}
