using UnitVent.Charting.Entries;

namespace UnitVent.Charting.Tests.Rules;

/// <summary>Limits: common practice.</summary>
public sealed class SlipsRuleTests : RuleTable
{
    public static TheoryData<Entry[], Circumstance[], string, string> R14 => new()
    {
        // 7.340/48 with constants 0.0307 and 6.105: 25.32 mmol/L; a pH shift of 0.03 and 0.06 is 27.1 and 29.1.
        { [Chart.Gas(pH: 7.340m, pCO2: 48.0m, bicarbonate: 25.3m)], [], Clear, "fits" },
        { [Chart.Gas(pH: 7.340m, pCO2: 48.0m, bicarbonate: 27.0m)], [], Clear, "within 0.03" },
        { [Chart.Gas(pH: 7.340m, pCO2: 48.0m, bicarbonate: 27.5m)], [], "Advisory", "beyond 0.03" },
        { [Chart.Gas(pH: 7.340m, pCO2: 48.0m, bicarbonate: 29.5m)], [], "Caution", "beyond 0.06" },
        { [Chart.Gas(pH: 7.3m, pCO2: 48, bicarbonate: 27)], [], Clear, "rounding of pH to one decimal explains it" },
        { [Chart.Gas(bicarbonate: 35) with { BicarbonateKind = BicarbonateKind.Standard }], [], CannotTell, "standard bicarbonate" },
        { [Chart.Gas(bicarbonate: null)], [], CannotTell, "no bicarbonate" },
        { [Chart.Gas(bicarbonate: 35)], [Circumstance.ComfortCare], CannotTell, "comfort care" },
        { [], [], CannotTell, "no gas" },
    };

    [Theory, MemberData(nameof(R14))]
    public void R14_GasDoesNotFit(Entry[] chart, Circumstance[] context, string expected, string reason) => Holds("R14", chart, context, expected, reason);

    // APRV 28/5, 4.5 s/0.5 s: mean pressure 25.7.
    public static TheoryData<Entry[], Circumstance[], string, string> R13 => new()
    {
        { [Chart.Aprv(), Mean(28.2m)], [], Clear, "2.5 cmH2O, but within 10 %" },
        { [Chart.Aprv(), Mean(28.3m)], [], "Advisory", "over 10 %" },
        { [Chart.Aprv(), Mean(30.8m)], [], "Advisory", "19.8 %" },
        { [Chart.Aprv(), Mean(30.9m)], [], "Caution", "over 20 %" },
        { [Chart.Aprv(), Mean(20.5m)], [], "Caution", "far below" },
        { [Chart.Aprv(high: 12, low: 0), Mean(12.8m)], [], Clear, "2 cmH2O" },
        { [Chart.Aprv(), Mean(31, 60), Chart.Aprv(40)], [], CannotTell, "settings were charted since" },
        { [Chart.Aprv(), Mean(null)], [], CannotTell, "not measured" },
        { [Chart.Aprv(), Mean(31, 361)], [], CannotTell, "stale" },
        { [Chart.PressureControl() with { Mode = VentilationMode.PressureSupport }, Mean(31)], [], CannotTell, "pressure support" },
        { [Chart.Aprv(), Mean(31)], [Circumstance.ComfortCare], CannotTell, "comfort care" },
    };

    public static TheoryData<Entry[], Circumstance[], string, string> R16 => new()
    {
        // At pH 7.40 and PaCO2 40 a PaO2 of 60 goes with 89–91 % (J Appl Physiol 1979;46:599).
        { [Fit(60, 95)], [], Clear, "within 5 points" },
        { [Fit(60, 97)], [], "Advisory", "oximeter high" },
        { [Fit(60, 98)], [], CannotTell, "SpO2 over 97" },
        { [Fit(60, 89)], [], CannotTell, "SpO2 under 90" },
        { [Fit(140, 93)], [], "Advisory", "oximeter low" },
        { [Chart.Aprv(), Fit(50, null), Chart.Check(45, spO2: 95)], [], "Advisory", "by a check 15 min before" },
        { [Chart.Aprv(), Fit(50, null), Chart.Check(46, spO2: 95)], [], CannotTell, "16 min apart" },
        { [Fit(50, 95) with { DrawnAt = Chart.Ago(721) }], [], CannotTell, "stale" },
        { [Fit(50, 95) with { BicarbonateMmolL = 33 }], [], CannotTell, "a gas that does not fit itself" },
        { [Fit(50, 95)], [Circumstance.ComfortCare], CannotTell, "comfort care" },
    };

    // 380 mL at 12 releases/min: 4.56 L/min.
    public static TheoryData<Entry[], Circumstance[], string, string> R18 => new()
    {
        { [Chart.Aprv(), Volumes(6.6m, null)], [], Clear, "own 2.0" },
        { [Chart.Aprv(), Volumes(4.4m, null)], [], Clear, "own −3.6 %" },
        { [Chart.Aprv(), Volumes(4.3m, null)], [], "Advisory", "own −6 %" },
        { [Chart.Aprv(), Volumes(6.6m, 3.3m)], [], Clear, "measured own within 1.32 of 2.04" },
        { [Chart.Aprv(), Volumes(6.6m, 3.4m)], [], "Advisory", "measured own beyond" },
        { [Chart.Aprv(), Volumes(4.3m, null) with { LeakPercent = 40 }], [], "Advisory", "a leak is named" },
        { [Chart.Aprv(), Volumes(4.3m, null) with { ReleaseVolumeMl = null }], [], CannotTell, "no release volume" },
        { [Chart.Aprv(), Volumes(4.3m, null) with { ObservedAt = Chart.Ago(361) }], [], CannotTell, "stale" },
        { [Chart.PressureControl(), Volumes(4.3m, null)], [], CannotTell, "another mode" },
        { [Chart.Aprv(), Volumes(4.3m, null)], [Circumstance.ComfortCare], CannotTell, "comfort care" },
    };

    [Theory, MemberData(nameof(R13))]
    public void R13_MeanPressuresDiffer(Entry[] chart, Circumstance[] context, string expected, string reason) => Holds("R13", chart, context, expected, reason);

    [Theory, MemberData(nameof(R16))]
    public void R16_OxygenDoesNotFit(Entry[] chart, Circumstance[] context, string expected, string reason) => Holds("R16", chart, context, expected, reason);

    [Theory, MemberData(nameof(R18))]
    public void R18_VolumesDoNotAddUp(Entry[] chart, Circumstance[] context, string expected, string reason) => Holds("R18", chart, context, expected, reason);

    private static VentilatorCheck Mean(decimal? cmH2O, double minutesAgo = 25) => Chart.Check(minutesAgo) with { MeanAirwayPressureCmH2O = cmH2O };

    private static BloodGas Fit(decimal pO2, decimal? spO2) => Chart.Gas(pO2: pO2, pH: 7.40m, pCO2: 40, bicarbonate: null) with { SpO2Percent = spO2 };

    private static VentilatorCheck Volumes(decimal total, decimal? own) => Chart.Check() with { TotalMinuteVolumeLMin = total, SpontaneousMinuteVolumeLMin = own };
}
