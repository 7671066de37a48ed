using NodaTime;
using UnitVent.Charting.Trends;

namespace UnitVent.Charting.Tests.Trends;

public sealed class StepTests
{
    [Fact]
    public void Step_IsHeldAgainstTheMedianOfTwelveHours()
    {
        SeriesPoint[] earlier = [At(800, 999), At(700, 200), At(500, 180), At(300, 220)];

        var step = Step.Of(earlier, At(30, 160))!;

        Assert.Equal((200, 160, 3), (step.Before, step.After, step.Count));
        Assert.Equal(-0.20, step.RelativeChange, 9);
    }

    [Fact]
    public void Step_WithoutEarlierValues_IsNone() => Assert.Null(Step.Of([At(800, 200)], At(30, 160)));

    [Fact]
    public void SettingStep_TakesTheFirstSettledValue_AndTheEpochBefore()
    {
        SeriesPoint[] series = [At(700, 100), At(500, 180), At(400, 200), At(290, 90), At(200, 150), At(100, 140)];

        var step = SettingStep.Of(series, Chart.Ago(300), Chart.Ago(600), Duration.FromMinutes(60))!;

        Assert.Equal((190, 150), (step.Step.Before, step.Step.After));
        Assert.Equal(Duration.FromMinutes(100), step.AfterChange);
    }

    [Fact]
    public void SettingStep_OfTheSameMinute_BelongsToTheSettingsBefore()
    {
        SeriesPoint[] series = [At(600, 100), At(500, 180), At(300, 200), At(299, 150)];

        var step = SettingStep.Of(series, Chart.Ago(300), Chart.Ago(600), Duration.Zero)!;

        Assert.Equal((190, 150, 2), (step.Step.Before, step.Step.After, step.Step.Count));
    }

    [Fact]
    public void SettingStep_WithNothingSettledYet_IsNone() =>
        Assert.Null(SettingStep.Of([At(500, 180), At(290, 150)], Chart.Ago(300), null, Duration.FromMinutes(60)));

    private static SeriesPoint At(double minutesAgo, double value) => new(Chart.Ago(minutesAgo), value);
}
