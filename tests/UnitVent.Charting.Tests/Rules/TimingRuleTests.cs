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
        { [Chart.Aprv(), .. Ends(78, 77, 67, 65), Method(SettingMethod.FlowGuided)], [], "Caution", "flow-guided: under the target of 75 twice and 10 points under the median of 77.5" },
        { [Chart.Aprv(), .. Ends(78, 77, 68, 65), Method(SettingMethod.FlowGuided)], [], Clear, "only once by 10 points" },
        { [Chart.Aprv(), .. Ends(88, 87, 76, 75), Method(SettingMethod.FlowGuided)], [], Clear, "by 11 points, but not under the target" },
        { [Chart.Aprv(), .. Ends(67, 65), Method(SettingMethod.FlowGuided)], [], Clear, "nothing to have fallen from" },
        { [Chart.Aprv(), .. Ends(78, 77, 67, 65).Select(c => c with { FlowReadings = 1 }), Method(SettingMethod.FlowGuided)], [], "Advisory", "fallen, one release" },
        { [Chart.Aprv(), Chart.Check(peak: 100, end: 40), Method(SettingMethod.TwoLevel)], [], CannotTell, "two levels are not judged" },
        { [Chart.Aprv(), Chart.Check(peak: 100, end: 52), Target(t => t with { EndReleaseFlowPercent = 60 })], [], "Caution", "own target 60: edge 55" },
        { [Chart.Aprv(), Chart.Check(peak: null, end: null)], [], CannotTell, "no flows" },
        { [Chart.Aprv(), Chart.Check(361, peak: 100, end: 40)], [], CannotTell, "stale" },
        { [Chart.PressureControl(), Chart.Check(peak: 100, end: 40)], [], CannotTell, "another mode" },
    };

    public static TheoryData<Entry[], Circumstance[], string, string> R02 => new()
    {
        { [Chart.Aprv(), Short(76), Acid(7.29m)], [], "Advisory", "over 75 % with pH under 7.30" },
        { [Chart.Aprv(), Short(75), Acid(7.29m)], [], Clear, "on the edge" },
        { [Chart.Aprv(), Short(76), Acid(7.30m)], [], Clear, "pH on the edge" },
        { [Chart.Aprv(), Short(76), Acid(7.25m)], [], "Advisory", "pH on the edge of caution" },
        { [Chart.Aprv(), Short(76), Acid(7.24m)], [], "Caution", "pH under 7.25" },
        { [Chart.Aprv(), Short(76), Chart.Gas(400, pCO2: 42, bicarbonate: null), Chart.Gas(bicarbonate: null)], [], "Advisory", "PaCO2 +6 mmHg" },
        { [Chart.Aprv(), Short(76), Chart.Gas(400, pCO2: 43, bicarbonate: null), Chart.Gas(bicarbonate: null)], [], Clear, "PaCO2 +5 mmHg" },
        { [Chart.Aprv(), Short(76, release: 211)], [], "Advisory", "release just under 3 mL/kg" },
        { [Chart.Aprv(), Short(76, release: 212)], [], Clear, "release just over 3 mL/kg" },
        { [Chart.Aprv(), Short(91), Acid(7.29m), Method(SettingMethod.FlowGuided)], [], "Advisory", "flow-guided: over 90 %" },
        { [Chart.Aprv(), Short(90), Acid(7.29m), Method(SettingMethod.FlowGuided)], [], Clear, "flow-guided: on the edge" },
        { [Chart.Aprv(), Short(76), Acid(7.29m), Target(t => t with { EndReleaseFlowPercent = 60 })], [], Clear, "own target 60: edge 85" },
        { [Chart.Aprv(), Short(76) with { FlowReadings = 1 }, Acid(7.24m)], [], "Advisory", "one release is one level lower" },
        { [Chart.Aprv(), Short(76), Acid(7.20m) with { BicarbonateMmolL = 35 }], [], Clear, "a gas that does not fit itself shows nothing" },
        { [Chart.Aprv(), Short(76), Acid(7.24m), Method(SettingMethod.TwoLevel)], [], CannotTell, "two levels are not judged" },
        { [Chart.Aprv(), Short(76) with { EffortDuringRelease = true }, Acid(7.24m)], [], CannotTell, "effort during the release" },
        { [Chart.Aprv(), Short(76), Acid(7.24m)], [Circumstance.AirLeak], CannotTell, "air leak" },
        { [Chart.Aprv(), Short(76) with { ObservedAt = Chart.Ago(361) }, Acid(7.24m)], [], CannotTell, "stale" },
        { [Chart.Aprv(), Chart.Check(peak: null, end: null), Acid(7.24m)], [], CannotTell, "no flows" },
    };

    public static TheoryData<Entry[], Circumstance[], string, string> R03 => new()
    {
        { [Chart.Aprv(tLow: 0.8m)], [], Clear, "on the upper edge" },
        { [Chart.Aprv(tLow: 0.81m)], [], "Advisory", "over 0.8 s" },
        { [Chart.Aprv(tLow: 0.3m)], [], Clear, "on the lower edge" },
        { [Chart.Aprv(tLow: 0.29m)], [], "Advisory", "under 0.3 s" },
        { [Chart.Aprv(tLow: 1.5m)], [], "Advisory", "on the edge of caution" },
        { [Chart.Aprv(tLow: 1.51m)], [], "Caution", "over 1.5 s" },
        { [Chart.Aprv(tLow: 1.5m)], [Circumstance.Obstructive], Clear, "obstructive: up to 1.5 s" },
        { [Chart.Aprv(tLow: 1.0m), Chart.Check()], [], Clear, "the flow is recorded" },
        { [Chart.Aprv(tLow: 1.0m), Chart.Check(361)], [], "Advisory", "the flow is stale" },
        { [Chart.Aprv(tLow: 1.0m), Method(SettingMethod.TwoLevel)], [], CannotTell, "two levels are not judged" },
        { [Chart.Aprv(721, tLow: 1.0m)], [], CannotTell, "settings stale" },
        { [Chart.PressureControl()], [], CannotTell, "another mode" },
    };

    public static TheoryData<Entry[], Circumstance[], string, string> R07 => new()
    {
        { [Chart.Aprv(tHigh: 5.5m)], [], Clear, "10 in the first 12 h" },
        { [Chart.Aprv(tHigh: 5.6m)], [], "Advisory", "9.8 in the first 12 h" },
        { [Chart.Aprv(tHigh: 3.8m)], [], Clear, "13.95" },
        { [Chart.Aprv(tHigh: 3.7m)], [], "Advisory", "14.3" },
        { [Chart.Aprv(tHigh: 2.5m)], [], "Advisory", "20" },
        { [Chart.Aprv(tHigh: 2.4m)], [], "Caution", "20.7" },
        { [Chart.Aprv(800, tHigh: 7), Chart.Check()], [], Clear, "8 after the first 12 h" },
        { [Chart.Aprv(800, tHigh: 7.1m), Chart.Check()], [], "Advisory", "7.9 after the first 12 h" },
        { [Chart.Aprv(tHigh: 14.5m) with { Phase = CoursePhase.Weaning }], [], Clear, "4 in weaning" },
        { [Chart.Aprv(tHigh: 14.6m) with { Phase = CoursePhase.Weaning }], [], "Advisory", "3.97 in weaning" },
        { [Chart.Aprv(tHigh: 1.5m), Method(SettingMethod.FlowGuided)], [], Clear, "flow-guided: 30" },
        { [Chart.Aprv(tHigh: 1.4m), Method(SettingMethod.FlowGuided)], [], "Caution", "flow-guided: 31.6" },
        { [Chart.Aprv(tHigh: 20), Method(SettingMethod.FlowGuided)], [], Clear, "flow-guided: few are not judged" },
        { [Chart.Aprv(tHigh: 1.4m), Method(SettingMethod.TwoLevel)], [], CannotTell, "two levels are not judged" },
        { [Chart.Aprv(tHigh: 2.4m)], [Circumstance.EcmoVv], CannotTell, "ECMO" },
        { [Chart.Aprv(721, tHigh: 2.4m)], [], CannotTell, "settings stale" },
        { [Chart.PressureControl()], [], CannotTell, "another mode" },
    };

    public static TheoryData<Entry[], Circumstance[], string, string> R08 => new()
    {
        { [Chart.Aprv(tHigh: 4, tLow: 1)], [], Clear, "80 %" },
        { [Chart.Aprv(tHigh: 3.9m, tLow: 1)], [], "Advisory", "79.6 %" },
        { [Chart.Aprv(tHigh: 3.5m, tLow: 1.5m)], [], "Advisory", "70 %" },
        { [Chart.Aprv(tHigh: 3.4m, tLow: 1.5m)], [], "Caution", "69.4 %" },
        { [Chart.Aprv(tHigh: 2, tLow: 1), Method(SettingMethod.FlowGuided)], [], CannotTell, "flow-guided" },
        { [Chart.Aprv(tHigh: 2, tLow: 1), Method(SettingMethod.TwoLevel)], [], CannotTell, "two levels" },
        { [Chart.Aprv(tHigh: 2, tLow: 1)], [Circumstance.EcmoVa], CannotTell, "ECMO" },
        { [Chart.Aprv(721, tHigh: 2, tLow: 1)], [], CannotTell, "settings stale" },
        { [Chart.PressureControl()], [], CannotTell, "another mode" },
    };

    public static TheoryData<Entry[], Circumstance[], string, string> R11 => new()
    {
        { [Chart.Aprv(low: 6), Chart.Check(peak: 100, end: 51)], [], "Advisory", "P low 6 with 51 %" },
        { [Chart.Aprv(low: 6), Chart.Check(peak: 100, end: 50)], [], Clear, "50 %" },
        { [Chart.Aprv(low: 5), Chart.Check(peak: 100, end: 80)], [], Clear, "never on 0–5" },
        { [Chart.Aprv(low: 6), Chart.Check(peak: 100, end: 80), Method(SettingMethod.TwoLevel)], [], CannotTell, "two levels are not judged" },
        { [Chart.Aprv(low: 6), Chart.Check(peak: 100, end: 80) with { EffortDuringRelease = true }], [], CannotTell, "effort during the release" },
        { [Chart.Aprv(low: 6), Chart.Check(peak: null, end: null)], [], CannotTell, "no flows" },
        { [Chart.Aprv(low: 6), Chart.Check(361, peak: 100, end: 80)], [], CannotTell, "stale" },
        { [Chart.PressureControl()], [], CannotTell, "another mode" },
    };

    [Theory, MemberData(nameof(R01))]
    public void R01_ReleasedLong(Entry[] chart, Circumstance[] context, string expected, string reason) => Holds("R01", chart, context, expected, reason);

    [Theory, MemberData(nameof(R02))]
    public void R02_ReleasedShort(Entry[] chart, Circumstance[] context, string expected, string reason) => Holds("R02", chart, context, expected, reason);

    [Theory, MemberData(nameof(R03))]
    public void R03_TimeLow(Entry[] chart, Circumstance[] context, string expected, string reason) => Holds("R03", chart, context, expected, reason);

    [Theory, MemberData(nameof(R07))]
    public void R07_ReleaseRate(Entry[] chart, Circumstance[] context, string expected, string reason) => Holds("R07", chart, context, expected, reason);

    [Theory, MemberData(nameof(R08))]
    public void R08_ShareAtPHigh(Entry[] chart, Circumstance[] context, string expected, string reason) => Holds("R08", chart, context, expected, reason);

    [Theory, MemberData(nameof(R11))]
    public void R11_PressureLowHolds(Entry[] chart, Circumstance[] context, string expected, string reason) => Holds("R11", chart, context, expected, reason);

    /// <summary>Checks every two hours.</summary>
    private static IEnumerable<VentilatorCheck> Ends(params decimal[] percent) =>
        percent.Select((end, i) => Chart.Check(25 + 120 * (percent.Length - 1 - i), peak: 100, end: end));

    private static VentilatorCheck Short(decimal endPercent, decimal release = 380) => Chart.Check(peak: 100, end: endPercent, release: release);

    private static BloodGas Acid(decimal pH) => Chart.Gas(pH: pH, bicarbonate: null);
}
