using UnitVent.Charting.Entries;

namespace UnitVent.Charting.Tests.Rules;

/// <summary>Limits: common practice.</summary>
public sealed class StepDownRuleTests : RuleTable
{
    public static TheoryData<Entry[], Circumstance[], string, string> R35 => new()
    {
        { [Chart.Aprv(), Chart.Aprv(60, high: 26)], [], "Advisory", "−2 cmH2O, T high as it was" },
        { [Chart.Aprv(), Chart.Aprv(60, high: 26, tHigh: 4.9m)], [], "Advisory", "0.4 s for 2 cmH2O" },
        { [Chart.Aprv(), Chart.Aprv(60, high: 26, tHigh: 5.0m)], [], Clear, "half of 1 s" },
        { [Chart.Aprv(), Chart.Aprv(60, high: 27)], [], Clear, "−1 cmH2O" },
        { [Chart.Aprv(tHigh: 12), Chart.Aprv(60, high: 26, tHigh: 12)], [], Clear, "T high is 12 s" },
        { [Chart.Aprv(), Chart.Aprv(60, high: 26) with { Reason = "volumes" }], [], Clear, "a reason" },
        { [Chart.Aprv(2000), Chart.Aprv(721, high: 26)], [], Clear, "12 h ago" },
        { [Chart.Aprv(), Chart.Aprv(60, high: 26)], [Circumstance.EcmoVv], CannotTell, "ECMO" },
        { [Chart.Aprv()], [], CannotTell, "no settings before" },
    };

    public static TheoryData<Entry[], Circumstance[], string, string> R36 => new()
    {
        { [Chart.Aprv(), Chart.Aprv(60, high: 25, tHigh: 6)], [], Clear, "−3 cmH2O" },
        { [Chart.Aprv(), Chart.Aprv(60, high: 24, tHigh: 7)], [], "Advisory", "−4 cmH2O" },
        { [Chart.Aprv(), Chart.Aprv(170, high: 27), Chart.Aprv(60, high: 26), Chart.Check(spO2: 87)], [], "Advisory", "110 min after the last, SpO2 under target" },
        { [Chart.Aprv(), Chart.Aprv(170, high: 27), Chart.Aprv(60, high: 26), Chart.Check(spO2: 88)], [], Clear, "SpO2 on target" },
        { [Chart.Aprv(), Chart.Aprv(180, high: 27), Chart.Aprv(60, high: 26), Chart.Check(spO2: 87)], [], Clear, "2 h after the last" },
        { [Chart.Aprv(), Chart.Aprv(60, high: 24)], [Circumstance.EcmoVv], CannotTell, "ECMO" },
        { [Chart.Aprv()], [], CannotTell, "no settings before" },
    };

    // Releases 300 mL at 5.7/min: 1.7 of 8.6 or 8.5 L/min.
    public static TheoryData<Entry[], Circumstance[], string, string> R37 => new()
    {
        { [Low(240), Own(9)], [], "Information", "for 4 h" },
        { [Low(239), Own(9)], [], Clear, "not yet for 4 h" },
        { [Low(240) with { PHighCmH2O = 16 }, Own(9)], [], Clear, "P high 16" },
        { [Low(240) with { THighS = 9.9m }, Own(9)], [], Clear, "T high under 10" },
        { [Low(240) with { FiO2 = 0.41m }, Own(9)], [], Clear, "FiO2 over 0.40" },
        { [Low(240), Own(8)], [], Clear, "own share under 80 %" },
        { [Low(240)], [], CannotTell, "own share not charted" },
        { [Low(240), Own(9)], [Circumstance.ComfortCare], CannotTell, "comfort care" },
        { [Chart.PressureControl()], [], CannotTell, "another mode" },
    };

    [Theory, MemberData(nameof(R35))]
    public void R35_StepWithoutTime(Entry[] chart, Circumstance[] context, string expected, string reason) => Holds("R35", chart, context, expected, reason);

    [Theory, MemberData(nameof(R36))]
    public void R36_LargeStep(Entry[] chart, Circumstance[] context, string expected, string reason) => Holds("R36", chart, context, expected, reason);

    [Theory, MemberData(nameof(R37))]
    public void R37_CpapLevel(Entry[] chart, Circumstance[] context, string expected, string reason) => Holds("R37", chart, context, expected, reason);

    private static SettingChange Low(double minutesAgo) => Chart.Aprv(minutesAgo, high: 15, low: 0, tHigh: 10, tLow: 0.5m, fiO2: 0.4m);

    private static VentilatorCheck Own(decimal total) => Chart.Check(release: 300) with { TotalMinuteVolumeLMin = total };
}
