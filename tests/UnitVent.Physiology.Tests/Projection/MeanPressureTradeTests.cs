using CsCheck;
using static UnitVent.Physiology.Tests.Given;

namespace UnitVent.Physiology.Tests;

public sealed class MeanPressureTradeTests
{
    /// <summary>Worked from the definition of the mean: mean, P low, T low, other P high, T high.</summary>
    public static TheoryData<double, double, double, double, double> PublishedTrades => new()
    {
        { 25.2, 0, 0.5, 27, 7.00 },
        { 25.2, 0, 0.5, 26, 15.75 },
        { 22.0, 0, 0.5, 24, 5.50 },
        { 20.0, 5, 0.8, 24, 3.00 },
    };

    /// <summary>Mean, P high, P low, T low: what can and what cannot keep the mean.</summary>
    public static TheoryData<double, double, double, double, bool, string> Limits => new()
    {
        { 25.2, 25.3, 0, 0.5, false, "126 s would be needed" },
        { 24, 25, 0, 2.5, true, "60 s, the longest time there is" },
        { 24, 25, 0, 2.501, false, "just beyond 60 s" },
        { 25.2, 25.2, 0, 0.5, false, "P high at the mean" },
        { 25.2, 24, 0, 0.5, false, "P high below the mean" },
        { 5, 10, 5, 0.5, false, "P low at the mean" },
        { 5, 10, 6, 0.5, false, "P low above the mean" },
        { 25.2, 27, 0, 0, false, "no release" },
    };

    [Theory, MemberData(nameof(PublishedTrades))]
    public void TimeHigh_OfPublishedTrade_IsAsPublished(double mean, double low, double timeLow, double high, double timeHigh)
    {
        Assert.True(MeanPressureTrade.CanKeepMean(CmH2O(mean), CmH2O(high), CmH2O(low), Seconds(timeLow)));
        Assert.Equal(timeHigh, MeanPressureTrade.TimeHigh(CmH2O(mean), CmH2O(high), CmH2O(low), Seconds(timeLow)).Seconds, 0.0051);
    }

    /// <summary>Worked from the definition of the mean.</summary>
    [Fact]
    public void High_OfPublishedTrade_IsAsPublished()
        => Assert.Equal(27.49, MeanPressureTrade.High(CmH2O(25.2), CmH2O(0), Seconds(5.5), Seconds(0.5)).CmH2O, 0.0051);

    [Theory, MemberData(nameof(Limits))]
    public void CanKeepMean_AroundItsLimits_DecidesWhetherTimeHighRefuses(
        double mean, double high, double low, double timeLow, bool expected, string reason)
    {
        Assert.True(expected == MeanPressureTrade.CanKeepMean(CmH2O(mean), CmH2O(high), CmH2O(low), Seconds(timeLow)), reason);
        var refusal = Record.Exception(() => MeanPressureTrade.TimeHigh(CmH2O(mean), CmH2O(high), CmH2O(low), Seconds(timeLow)));
        Assert.Equal(expected, refusal is null);
    }

    [Fact]
    public void High_WithoutAMeanAboveLowOrATime_Refuses()
    {
        Expect.Refused(() => MeanPressureTrade.High(CmH2O(5), CmH2O(5), Seconds(5), Seconds(0.5)));
        Expect.RefusedSaying("Parameter 'timeHigh'", () => MeanPressureTrade.High(CmH2O(25), CmH2O(0), Seconds(0), Seconds(0.5)));
        Expect.RefusedSaying("Parameter 'timeLow'", () => MeanPressureTrade.High(CmH2O(25), CmH2O(0), Seconds(5), Seconds(0)));
        Expect.Refused(() => MeanPressureTrade.High(CmH2O(100), CmH2O(0), Seconds(0.5), Seconds(1)));
    }

    /// <summary>Common practice: 5 releases a minute.</summary>
    [Theory]
    [InlineData(11.5, 0.5, true)]
    [InlineData(11.6, 0.5, false)]
    [InlineData(11.2, 0.8, true)]
    [InlineData(12, 0.1, false)] // 12 s itself is never reached
    [InlineData(11.7, 0.3, true)] // a sum that doubles miss by a digit
    public void IsWithinLimits_AroundFiveReleasesAMinute_IsFalseBeyond(double timeHigh, double timeLow, bool expected)
        => Assert.Equal(expected, MeanPressureTrade.IsWithinLimits(Seconds(timeHigh), Seconds(timeLow)));

    [Fact]
    public void Trade_ThereAndBack_KeepsTheMean()
        => Gen.Select(Gen.Double[1, 20], Gen.Double[0, 10], Gen.Double[0.2, 1], Gen.Double[1, 20]).Sample((aboveLow, low, timeLow, timeHigh) =>
        {
            var (mean, floor, release) = (CmH2O(low + aboveLow), CmH2O(low), Seconds(timeLow));
            var high = MeanPressureTrade.High(mean, floor, Seconds(timeHigh), release);
            var back = MeanPressureTrade.TimeHigh(mean, high, floor, release);
            return Math.Abs(MeanAirwayPressure.Aprv(high, floor, back, release).CmH2O - mean.CmH2O) < 1e-9
                && Math.Abs(back.Seconds - timeHigh) < 1e-6;
        });
}
