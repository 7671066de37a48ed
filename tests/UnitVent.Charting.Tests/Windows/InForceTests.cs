using UnitVent.Charting.Entries;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Windows;

namespace UnitVent.Charting.Tests.Windows;

public sealed class InForceTests
{
    public static TheoryData<double, RelativeToChange?, decimal, string> Draws => new()
    {
        { 60, null, 28, "the same minute means before the change" },
        { 59, null, 30, "a minute later it belongs to the new settings" },
        { 120, null, 28, "long before" },
        { 60, RelativeToChange.After, 30, "the same minute, charted as after" },
        { 55, RelativeToChange.Before, 28, "5 min after, charted as before" },
        { 30, RelativeToChange.Before, 30, "half an hour after a change cannot be before it" },
    };

    [Theory, MemberData(nameof(Draws))]
    public void SettingsAtDraw_NearAChange(double minutesAgo, RelativeToChange? relative, decimal pHigh, string reason)
    {
        var window = new Chart().With(Chart.Aprv(600), Chart.Aprv(60, high: 30)).Window();
        var gas = Chart.Gas(minutesAgo) with { RelativeToChange = relative };

        Assert.True(pHigh == InForce.SettingsAtDraw(window, gas, gas.DrawnAt!.Value)!.Value.Body.PHighCmH2O, reason);
    }

    [Fact]
    public void Check_OfAnotherSettingsEpoch_DoesNotGoWithTheGas()
    {
        var chart = new Chart().With(Chart.Aprv(600), Chart.Check(70), Chart.Aprv(60, high: 30), Chart.Gas(30), Chart.Check(85));

        Assert.Null(chart.Picture().LatestGas!.Check);
        Assert.Equal(Chart.Ago(10), chart.With(Chart.Check(10)).Picture().LatestGas!.Check!.Value.At);
    }

    [Fact]
    public void Context_EndsWhenItsLaterEntrySaysSo()
    {
        var window = new Chart().With(
            new ContextChange { Flag = Circumstance.AirLeak, From = Chart.Ago(500) },
            new ContextChange { Flag = Circumstance.Ards, From = Chart.Ago(500) },
            new ContextChange { Flag = Circumstance.AirLeak, From = Chart.Ago(300), Until = Chart.Ago(100) }).Window();

        Assert.Equal([Circumstance.Ards], InForce.Context(window, Chart.Now).Select(c => c.Body.Flag!.Value));
        Assert.Equal(2, InForce.Context(window, Chart.Ago(200)).Count);
    }

    [Fact]
    public void Targets_ExpireByThemselves()
    {
        var window = new Chart().With(new TargetSet { From = Chart.Ago(500), ExpiresAt = Chart.Ago(10), Reason = "r" }).Window();

        Assert.NotNull(InForce.Targets(window, Chart.Ago(11)));
        Assert.Null(InForce.Targets(window, Chart.Now));
    }

    [Fact]
    public void Epoch_StartsAnewWithModeAndPosition_NotWithAPressure()
    {
        var chart = new Chart().With(Chart.PressureControl(900), Chart.Aprv(600), Chart.Aprv(300, high: 30));

        Assert.Equal(Chart.Ago(600), InForce.EpochStart(chart.Window(), Chart.Now));
        Assert.Equal(Chart.Ago(200), InForce.EpochStart(chart.With(new BedsideEvent { At = Chart.Ago(200), What = EventKind.Prone }).Window(), Chart.Now));
    }

    [Fact]
    public void SameSample_ChartedTwice_IsOneGas()
    {
        var chart = new Chart().With(Chart.Aprv(), Chart.Gas(40, 75) with { SampleNumber = "A1" }, Chart.Gas(40, 76) with { SampleNumber = "A1" });

        Assert.Equal(76m, Assert.Single(GasPairing.Arterial(chart.Window(), Chart.Now)).Gas.Body.PO2);
    }

    [Fact]
    public void Phase_ChosenLater_WinsOverTheOneThatCameWithAChange()
    {
        var chart = new Chart().With(Chart.Aprv(600) with { Phase = CoursePhase.Maintaining }, new PhaseChoice { Phase = CoursePhase.Weaning, From = Chart.Ago(100) });

        Assert.Equal(CoursePhase.Weaning, chart.Picture().Phase);
        Assert.Equal(CoursePhase.Maintaining, chart.Picture(Chart.Ago(200)).Phase);
    }
}
