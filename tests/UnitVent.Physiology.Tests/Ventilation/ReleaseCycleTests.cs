using CsCheck;
using static UnitVent.Physiology.Tests.Given;

namespace UnitVent.Physiology.Tests;

public sealed class ReleaseCycleTests
{
    /// <summary>Definitions: T high, T low, rate, ratio, share at P high.</summary>
    public static TheoryData<double, double, double, double, double> PublishedCycles => new()
    {
        { 5.0, 0.5, 10.91, 10.0, 90.9 },
        { 4.5, 0.5, 12.00, 9.0, 90.0 },
        { 4.0, 0.8, 12.50, 5.0, 83.3 },
        { 6.0, 0.6, 9.09, 10.0, 90.9 },
        { 5.5, 0.5, 10.00, 11.0, 91.7 },
    };

    [Theory, MemberData(nameof(PublishedCycles))]
    public void Cycle_OfPublishedTimes_IsAsPublished(double timeHigh, double timeLow, double rate, double ratio, double sharePercent)
    {
        Assert.Equal(timeHigh + timeLow, ReleaseCycle.CycleTime(Seconds(timeHigh), Seconds(timeLow)).Seconds, 1e-9);
        Assert.Equal(rate, ReleaseCycle.Rate(Seconds(timeHigh), Seconds(timeLow)).PerMinute, 0.0051);
        Assert.Equal(ratio, ReleaseCycle.Ratio(Seconds(timeHigh), Seconds(timeLow)), 1e-9);
        Assert.Equal(sharePercent, ReleaseCycle.ShareAtHighPercent(Seconds(timeHigh), Seconds(timeLow)), 0.051);
    }

    [Fact]
    public void RateTimesCycle_OfAnyTimes_IsOneMinute()
        => Gen.Select(Gen.Double[0.4, 30], Gen.Double[0.01, 30]).Sample((timeHigh, timeLow) =>
            Math.Abs((ReleaseCycle.Rate(Seconds(timeHigh), Seconds(timeLow)).PerMinute * (timeHigh + timeLow)) - 60) < 1e-9);

    [Theory]
    [InlineData(0, 0.5)]
    [InlineData(5, 0)]
    [InlineData(59.6, 0.5)]
    public void Cycle_OfImpossibleTimes_Refuses(double timeHigh, double timeLow)
    {
        Expect.Refused(() => ReleaseCycle.CycleTime(Seconds(timeHigh), Seconds(timeLow)));
        Expect.Refused(() => ReleaseCycle.Rate(Seconds(timeHigh), Seconds(timeLow)));
        Expect.Refused(() => ReleaseCycle.Ratio(Seconds(timeHigh), Seconds(timeLow)));
        Expect.Refused(() => ReleaseCycle.ShareAtHighPercent(Seconds(timeHigh), Seconds(timeLow)));
    }

    [Fact]
    public void Rate_AroundTheShortestCycle_RefusesBelowIt()
    {
        Assert.Equal(150, ReleaseCycle.Rate(Seconds(0.2), Seconds(0.2)).PerMinute, 1e-9);
        Expect.Refused(() => ReleaseCycle.Rate(Seconds(0.2), Seconds(0.19)));
    }
}
