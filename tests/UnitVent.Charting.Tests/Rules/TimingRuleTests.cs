using UnitVent.Charting.Entries;

namespace UnitVent.Charting.Tests.Rules;

/// <summary>Limits: Intensive Care Med 2017;43:1648 and Eur Respir Rev 2019;28:180126.</summary>
public sealed class TimingRuleTests : RuleTable
{
    /// <summary>Intensive Care Med 2017;43:1648 (end of release at 50 % of peak), Eur Respir Rev 2019;28:180126 (75 %).</summary>
    public static TheoryData<Entry[], Circumstance[], string, string> R01 => new()
    {
        { [Chart.Aprv(), Chart.Check(peak: 100, end: 60)], [], Clear, "60 % at a target of 50" },
        { [Chart.Aprv(), Chart.Check(peak: 100, end: 45)], [], Clear, "on the caution edge, once" },
        { [Chart.Aprv(), Chart.Check(peak: 100, end: 44)], [], "Caution", "under the caution edge" },
        { [Chart.Aprv(), Chart.Check(200, peak: 100, end: 48), Chart.Check(peak: 100, end: 48)], [], "Advisory", "45–50 in two checks running" },
        { [Chart.Aprv(), Chart.Check(200, peak: 100, end: 60), Chart.Check(peak: 100, end: 48)], [], Clear, "45–50 once" },
        { [Chart.Aprv(low: 4), Chart.Check(peak: 100, end: 24)], [], "Urgent", "under 25 with P low under 5" },
        { [Chart.Aprv(low: 5), Chart.Check(peak: 100, end: 24)], [], "Caution", "under 25 with P low holding" },
        { [Chart.Aprv(), Chart.Check(peak: 100, end: 40) with { FlowReadings = 1, ReleasesAveraged = 1 }], [], "Advisory", "one release is one level lower" },
        { [Chart.Aprv(), Chart.Check(peak: 100, end: 40) with { EffortDuringRelease = true }], [], CannotTell, "effort during the release" },
        { [Chart.Aprv(), Chart.Check(peak: 100, end: 40)], [Circumstance.AirLeak], CannotTell, "air leak" },
        { [Chart.Aprv(), Chart.Check(peak: 100, end: 40) with { LeakPercent = 31 }], [], CannotTell, "leak above 30 %" },
        { [Chart.Aprv(), Chart.Check(peak: 100, end: 30)], [Circumstance.Obstructive], Clear, "obstructive: edge 25" },
        { [Chart.Aprv(), Chart.Check(peak: 100, end: 24)], [Circumstance.Obstructive], "Caution", "obstructive: under 25" },
        { [Chart.Aprv(low: 0), Chart.Check(peak: 100, end: 9)], [Circumstance.Obstructive], "Urgent", "obstructive: under 10" },
        { [Chart.Aprv(), Chart.Check(peak: 100, end: 59), Method(SettingMethod.FlowGuided)], [], "Caution", "flow-guided: under 60" },
        { [Chart.Aprv(), Chart.Check(peak: 100, end: 40), Method(SettingMethod.TwoLevel)], [], CannotTell, "two levels are not judged" },
        { [Chart.Aprv(), Chart.Check(peak: 100, end: 52), Target(t => t with { EndReleaseFlowPercent = 60 })], [], "Caution", "own target 60: edge 55" },
        { [Chart.Aprv(), Chart.Check(peak: null, end: null)], [], CannotTell, "no flows" },
        { [Chart.Aprv(), Chart.Check(361, peak: 100, end: 40)], [], CannotTell, "stale" },
        { [Chart.PressureControl(), Chart.Check(peak: 100, end: 40)], [], CannotTell, "another mode" },
    };

    [Theory, MemberData(nameof(R01))]
    public void R01_ReleasedLong(Entry[] chart, Circumstance[] context, string expected, string reason) => Holds("R01", chart, context, expected, reason);
}
