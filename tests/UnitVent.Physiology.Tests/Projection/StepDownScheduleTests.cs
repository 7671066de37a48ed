using static UnitVent.Physiology.Tests.Given;

namespace UnitVent.Physiology.Tests;

public sealed class StepDownScheduleTests
{
    private static AprvSettings Start => new(CmH2O(28), CmH2O(0), Seconds(4.5), Seconds(0.5));

    /// <summary>Worked from the definitions for 2 cmH2O and 1 s a step (common practice): P high, T high, mean pressure, rate.</summary>
    public static TheoryData<double, double, double, double> PublishedTable => new()
    {
        { 28, 4.5, 25.20, 12.0 },
        { 26, 5.5, 23.83, 10.0 },
        { 24, 6.5, 22.29, 8.57 },
        { 22, 7.5, 20.62, 7.50 },
        { 20, 8.5, 18.89, 6.67 },
        { 18, 9.5, 17.10, 6.00 },
        { 16, 10.5, 15.27, 5.45 },
        { 14, 11.5, 13.42, 5.00 },
        { 12, 12.5, 11.54, 4.62 },
    };

    [Fact]
    public void From_PublishedStart_GivesThePublishedTableUpToFiveReleasesAMinute()
    {
        var stages = StepDownSchedule.From(Start, CmH2O(2), Seconds(1));

        var printed = PublishedTable.Select(row => row.Data).ToList();
        Assert.Equal(printed.Count - 1, stages.Count);
        Assert.All(stages.Zip(printed), pair =>
        {
            var (stage, (high, timeHigh, mean, rate)) = pair;
            Assert.Equal((high, timeHigh), (stage.High.CmH2O, stage.TimeHigh.Seconds));
            Assert.Equal(mean, stage.MeanPressure.CmH2O, 0.0051);
            Assert.Equal(rate, stage.Rate.PerMinute, 0.0051);
        });
    }

    /// <summary>The last printed row is right as arithmetic, but beyond the limit of 5 releases a minute, so no stage of the schedule.</summary>
    [Theory, MemberData(nameof(PublishedTable))]
    public void Equations_OnEachPrintedRow_GiveThePrintedNumbers(double high, double timeHigh, double mean, double rate)
    {
        Assert.Equal(mean, MeanAirwayPressure.Aprv(CmH2O(high), CmH2O(0), Seconds(timeHigh), Seconds(0.5)).CmH2O, 0.0051);
        Assert.Equal(rate, ReleaseCycle.Rate(Seconds(timeHigh), Seconds(0.5)).PerMinute, 0.0051);
    }

    [Fact]
    public void From_WithTenthsOfASecond_ReachesFiveReleasesAMinute()
        => Assert.Equal(11.7, StepDownSchedule.From(At(28, 0, 11.1, 0.3), CmH2O(2), Seconds(0.2))[^1].TimeHigh.Seconds, 1e-9);

    [Theory]
    [InlineData(20, 10, 5, 2, "15 only: 10 itself is P low")]
    [InlineData(20, 9.9, 5, 3, "10 is still above P low")]
    [InlineData(16.1, 15, 1.1, 1, "15.000000000000002 is P low, but for a digit")]
    [InlineData(20, 5, 0.5, 30, "in halves of a cmH2O")]
    public void From_WithoutStretch_EndsAboveLow(double high, double low, double step, int stages, string reason)
        => Assert.True(stages == StepDownSchedule.From(At(high, low, 5, 0.5), CmH2O(step), default).Count, reason);

    [Fact]
    public void From_SettingsBeyondTheLimits_HoldsOnlyThese()
        => Assert.Equal([CmH2O(28)], StepDownSchedule.From(At(28, 0, 20, 0.5), CmH2O(2), Seconds(1)).Select(stage => stage.High));

    [Fact]
    public void From_OneStageToTheNext_MeanPressureAndRateFall()
        => Assert.All(
            StepDownSchedule.From(Start, CmH2O(1), Seconds(0.5)).Zip(StepDownSchedule.From(Start, CmH2O(1), Seconds(0.5)).Skip(1)),
            pair => Assert.True(pair.Second.MeanPressure.CmH2O < pair.First.MeanPressure.CmH2O && pair.Second.Rate.PerMinute < pair.First.Rate.PerMinute));

    [Theory]
    [InlineData(0.5, true)]
    [InlineData(5, true)]
    [InlineData(0.49, false)]
    [InlineData(5.01, false)]
    public void From_AroundTheLimitsOfAStep_RefusesOutside(double step, bool expected)
        => Assert.Equal(expected, Record.Exception(() => StepDownSchedule.From(Start, CmH2O(step), Seconds(1))) is null);

    [Fact]
    public void From_ImpossibleSettings_Refuses()
    {
        Expect.Refused(() => StepDownSchedule.From(At(5, 5, 4.5, 0.5), CmH2O(2), Seconds(1)));
        Expect.Refused(() => StepDownSchedule.From(At(28, 0, 0, 0.5), CmH2O(2), Seconds(1)));
    }

    private static AprvSettings At(double high, double low, double timeHigh, double timeLow)
        => new(CmH2O(high), CmH2O(low), Seconds(timeHigh), Seconds(timeLow));
}
