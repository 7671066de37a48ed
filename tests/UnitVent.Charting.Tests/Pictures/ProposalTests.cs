using UnitVent.Charting.Entries;

namespace UnitVent.Charting.Tests.Pictures;

/// <summary>Phases and methods as the chart shows them [common practice]; nothing follows until a person confirms.</summary>
public sealed class ProposalTests
{
    private static PhaseChoice In(CoursePhase phase) => new() { Phase = phase, From = Chart.Ago(2000) };

    public static TheoryData<Entry[], CoursePhase?, string> Phases => new()
    {
        { [Chart.Aprv(719)], null, "less than 12 h in the mode, no gas" },
        { [Chart.Aprv(720)], CoursePhase.Maintaining, "12 h in the mode" },
        { [Chart.Aprv(500), Chart.Gas(300), Chart.Gas(30)], CoursePhase.Maintaining, "two settled gases" },
        { [Chart.Aprv(500), Chart.Gas(30)], null, "one settled gas" },
        { [Chart.Aprv(720), In(CoursePhase.Maintaining)], null, "it is in force" },
        { [In(CoursePhase.Maintaining), Chart.Aprv(900, 28), Chart.Aprv(600, 26), Chart.Aprv(300, 24)], CoursePhase.Weaning, "two steps down at FiO2 0.50" },
        { [In(CoursePhase.Maintaining), Chart.Aprv(900, 28), Chart.Aprv(300, 26)], null, "one step down" },
        { [In(CoursePhase.Maintaining), Chart.Aprv(900, 28, fiO2: 0.55m), Chart.Aprv(600, 26, fiO2: 0.55m), Chart.Aprv(300, 24, fiO2: 0.55m)], null, "at FiO2 0.55" },
        { [In(CoursePhase.Weaning), Chart.Aprv(900, 24), Chart.Aprv(300, 26)], CoursePhase.SteppingUp, "P high went up" },
        { [In(CoursePhase.Weaning), Chart.Aprv(900), Chart.Aprv(300, fiO2: 0.60m)], CoursePhase.SteppingUp, "FiO2 went up by 0.10" },
        { [In(CoursePhase.Weaning), Chart.Aprv(900), Chart.Aprv(300, fiO2: 0.59m)], null, "FiO2 went up by less" },
    };

    [Theory, MemberData(nameof(Phases))]
    public void Phase_ThatTheChartLooksLike_IsProposed(Entry[] chart, CoursePhase? expected, string reason)
    {
        var proposal = new Chart().With(chart).Picture().PhaseProposal;

        Assert.True(proposal?.Value == expected, $"{reason}: {proposal}");
        Assert.Equal(expected is null, string.IsNullOrEmpty(proposal?.Because));
    }

    public static TheoryData<Entry[], SettingMethod?, string> Methods => new()
    {
        { [Chart.Aprv(low: 5, tLow: 1.0m)], SettingMethod.TwoLevel, "P low 5 with T low 1 s" },
        { [Chart.Aprv(low: 4, tLow: 1.0m)], null, "P low under 5" },
        { [Chart.Aprv(), Chart.Check(300, 100, 70), Chart.Check(200, 100, 75), Chart.Check(30, 100, 80)], SettingMethod.FlowGuided, "three checks near 75 %" },
        { [Chart.Aprv(), Chart.Check(200, 100, 75), Chart.Check(30, 100, 80)], null, "two checks" },
        { [Chart.Aprv(), Chart.Check(300, 100, 50), Chart.Check(200, 100, 75), Chart.Check(30, 100, 80)], null, "one of three at 50 %" },
        { [Chart.PressureControl()], null, "another mode" },
    };

    [Theory, MemberData(nameof(Methods))]
    public void Method_ThatTheChartLooksLike_IsProposed(Entry[] chart, SettingMethod? expected, string reason) =>
        Assert.True(new Chart().With(chart).Picture().MethodProposal?.Value == expected, reason);
}
