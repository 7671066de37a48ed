using NodaTime;
using UnitVent.Charting.Flags;
using UnitVent.Charting.Rules;

namespace UnitVent.Charting.Tests.Flags;

public sealed class ReplayTests
{
    /// <summary>A release that ends long (44 % of a target of 50), then one that does not; the check between them falls due by time alone.</summary>
    private static Chart Story() => new Chart().With(Chart.Aprv(700), Chart.Gas(690), Chart.Check(680, peak: 100, end: 44), Chart.Check(100, peak: 100, end: 60));

    [Fact]
    public void Replay_GoesThroughEntriesAndThroughMomentsOfTimeAlone()
    {
        var steps = Replay.Run(Story().Window(), Chart.Ago(720), Chart.Now).Select(s => (s.At, s.Step.Kind, s.Step.Finding.Rule)).ToList();

        Assert.Contains((Chart.Ago(678), FlagStepKind.Raised, "R01"), steps);
        Assert.Contains((Chart.Ago(380) + Duration.FromSeconds(1), FlagStepKind.Raised, "R32"), steps);
        Assert.Contains((Chart.Ago(98), FlagStepKind.Cleared, "R01"), steps);
        Assert.Contains((Chart.Ago(98), FlagStepKind.Cleared, "R32"), steps);
        Assert.Equal(steps.Select(s => s.At).Order(), steps.Select(s => s.At));
    }

    [Fact]
    public void Replay_KnowsNothingBeforeItWasRecorded() =>
        Assert.DoesNotContain(Replay.Known(Story().Window(), Chart.Ago(679)).Standing, e => e.EffectiveAt == Chart.Ago(680));

    [Fact]
    public void Replay_UnderOtherThresholds_SaysWhatThoseWouldHaveRaised()
    {
        var chart = Story();
        chart.Unit = chart.Unit with { Thresholds = RuleThresholds.With(new Dictionary<string, double> { ["R01.fixedRateTarget"] = 40 }) };

        Assert.DoesNotContain(Replay.Run(chart.Window(), Chart.Ago(720), Chart.Now), s => s.Step.Finding.Rule == "R01");
    }
}
