using UnitVent.Charting.Entries;

namespace UnitVent.Charting.Tests.Rules;

/// <summary>Limits: Chest 1983;84:14 and JAMA 2012;307:2526.</summary>
public sealed class CollapseRuleTests : RuleTable
{
    /// <summary>Step of P/F by a fifth: Chest 1983;84:14; not above 300: JAMA 2012;307:2526.</summary>
    public static TheoryData<Entry[], Circumstance[], string, string> R24 => new()
    {
        { [Chart.Aprv(), Chart.Gas(400, 100), Chart.Gas(30, 80)], [], "Advisory", "P/F 200 → 160, exactly a fifth" },
        { [Chart.Aprv(), Chart.Gas(400, 100), Chart.Gas(30, 81)], [], Clear, "less than a fifth" },
        { [Chart.Aprv(), Chart.Gas(400, 100), Chart.Gas(200, 79), Chart.Gas(30, 78)], [], "Caution", "a second gas" },
        { [Chart.Aprv(), Chart.Gas(400, 100) with { SpO2Percent = 97 }, Chart.Gas(30, 80) with { SpO2Percent = 94 }], [], "Caution", "SpO2 fell by 3" },
        { [Chart.Aprv(), Chart.Gas(400, 100), Chart.Gas(30, 59)], [], "Urgent", "PaO2 under 60" },
        { [Chart.Aprv(), Chart.Gas(400, 100), Chart.Gas(30, 80), Chart.Check(spO2: 87)], [], "Urgent", "SpO2 under target" },
        { [Chart.Aprv(fiO2: 0.3m), Chart.Gas(400, 120, 0.3m), Chart.Gas(30, 91, 0.3m)], [], Clear, "still above 300" },
        { [Chart.Aprv(600), Chart.Aprv(200, high: 26), Chart.Gas(400, 100), Chart.Gas(30, 78)], [], CannotTell, "mean pressure was lowered by 1.8" },
        { [Chart.Aprv(600), Chart.Aprv(200, high: 29), Chart.Gas(400, 100), Chart.Gas(30, 80)], [], "Advisory", "worse although mean pressure was raised" },
        { [Chart.Aprv(600), Chart.Aprv(60, high: 30), Chart.Gas(400, 100), Chart.Gas(30, 80)], [], CannotTell, "30 min after a pressure rise" },
        { [Chart.Aprv(), Chart.Gas(400, 100), Chart.Gas(30, 95, 0.62m)], [], CannotTell, "FiO2 differs by more than 0.10" },
        { [Chart.Aprv(), Event(500, EventKind.Prone), Event(200, EventKind.Supine), Chart.Gas(400, 100), Chart.Gas(30, 80)], [], CannotTell, "another position" },
        { [Chart.Aprv(), Chart.Gas(400, 100), Event(45, EventKind.Suction), Chart.Gas(30, 80)], [], CannotTell, "15 min after suction" },
        { [Chart.Aprv(1000), Chart.Gas(800, 100), Chart.Gas(30, 80)], [], Clear, "the earlier gas lies more than 12 h before" },
        { [Chart.Aprv(), Chart.Gas(400, 100), Chart.Gas(30, 80)], [Circumstance.EcmoVv], CannotTell, "ECMO" },
        { [Chart.Aprv(1500), .. Gases(83, 80, 77, 74, 71)], [], "Caution", "a drift by 24 from a median of 160, exactly 15 %" },
        { [Chart.Aprv(1500), .. Gases(83, 80.1m, 77.1m, 74.1m, 71.2m)], [], Clear, "a drift by less" },
        { [Chart.Aprv(1500), .. Gases(83, 80, 77, 74, 76)], [], Clear, "no order in time" },
        { [Chart.Aprv(1500), .. Gases(83, 80, 71)], [], Clear, "three gases" },
        { [Chart.Aprv(1500), .. Gases(83, 80, 77, 74, 71), Event(700, EventKind.Prone), Event(500, EventKind.Supine)], [], Clear, "a drift does not run across a turn" },
        { [Chart.Aprv(1500), .. Gases(78, 73, 68, 63, 59)], [], "Urgent", "a drift and PaO2 under 60" },
        { [Chart.Aprv(), Chart.Gas(30, 80)], [], CannotTell, "no earlier gas" },
        { [Chart.Aprv(), Chart.Gas(400, 100), Chart.Gas(30, 80) with { Specimen = Specimen.Venous }], [], CannotTell, "a venous gas says nothing" },
    };

    // Male 175 cm: 70.566 kg, so 4 mL/kg are 282.3 mL and 1 mL/kg 70.6 mL.
    public static TheoryData<Entry[], Circumstance[], string, string> R05 => new()
    {
        { [Chart.Aprv(), Chart.Check(release: 282), Acid(7.29m)], [], "Caution", "just under 4 mL/kg and 7.30" },
        { [Chart.Aprv(), Chart.Check(release: 283), Acid(7.29m)], [], Clear, "just over 4 mL/kg" },
        { [Chart.Aprv(), Chart.Check(release: 282), Acid(7.30m)], [], Clear, "pH 7.30" },
        { [Chart.Aprv(), Chart.Check(release: 282)], [], CannotTell, "no gas" },
        { [Chart.Aprv(), Chart.Check(release: 282), Acid(7.20m) with { BicarbonateMmolL = 35 }], [], CannotTell, "the gas does not fit itself" },
        { [Chart.Aprv(), Chart.Check(release: 282), Acid(7.29m) with { Specimen = Specimen.Venous }], [], CannotTell, "a venous gas" },
        { [Chart.Aprv(), .. Releases(440, 422.2m, 404.4m, 386.6m, 368.8m)], [], "Advisory", "a drift by 71.2 mL at the same settings" },
        { [Chart.Aprv(), .. Releases(440, 422.5m, 405, 387.5m, 370)], [], Clear, "a drift by 70 mL" },
        { [Chart.Aprv(), .. Releases(440, 420, 400, 380, 360), Chart.Aprv(300, tLow: 0.6m)], [], Clear, "T low was changed in the window" },
        { [Chart.Aprv(), Chart.Check(release: 282), Acid(7.29m)], [Circumstance.EcmoVv], CannotTell, "ECMO" },
        { [Chart.Aprv(), Chart.Check(361, release: 282), Acid(7.29m)], [], CannotTell, "stale" },
        { [Chart.Aprv(), Chart.Check(release: null), Acid(7.29m)], [], CannotTell, "no release volume" },
    };

    public static TheoryData<Entry[], Circumstance[], string, string> R09 => new()
    {
        { [Chart.Aprv(), .. Releases(420, 400, 380, 360, 340)], [], "Caution", "by 80 of a median of 400 mL at the same swing, exactly a fifth" },
        { [Chart.Aprv(), .. Releases(420, 400.1m, 380.2m, 360.3m, 340.4m)], [], Clear, "less than a fifth" },
        { [Chart.Aprv(), .. Releases(420, 390, 360, 330)], [], "Advisory", "four checks: a drift, but not a sure one" },
        { [Chart.Aprv(), .. Releases(340, 360, 380, 400, 420)], [], Clear, "rising" },
        { [Chart.Aprv(), .. Releases(420, 340, 400, 320, 380)], [], Clear, "no order in time" },
        { [Chart.Aprv(), .. Releases(420, 380, 340)], [], CannotTell, "three checks" },
        { [Chart.Aprv(), .. Releases(420, 400, 380, 360, 340), Chart.Aprv(300, high: 27)], [], CannotTell, "P high was changed in the window" },
        { [Chart.Aprv(), .. Releases(420, 400, 380, 360, 340), Chart.Aprv(300, tHigh: 5)], [], "Caution", "T high does not matter to it" },
        { [Chart.Aprv(), .. Releases(420, 400, 380, 360, 340).Select(c => c with { EndReleaseFlowLMin = 48.6m })], [], CannotTell, "end-release flow at 81 % does not count" },
        { [Chart.Aprv(), .. Releases(420, 400, 380, 360, 340).Select(c => c with { EffortDuringRelease = true })], [], CannotTell, "effort during the release" },
        { [Chart.Aprv(), .. Releases(420, 400, 380, 360, 340)], [Circumstance.AirLeak], CannotTell, "air leak" },
        { [Chart.Aprv(1000), .. Releases(420, 400, 380, 360, 340).Select(c => c with { ObservedAt = c.ObservedAt - NodaTime.Duration.FromHours(6) })], [], CannotTell, "stale" },
        { [], [], CannotTell, "nothing charted" },
    };

    /// <summary>At T high 4.5 s and T low 0.5 s mean pressure is 0.9 P high + 0.1 P low.</summary>
    public static TheoryData<Entry[], Circumstance[], string, string> R34 => new()
    {
        { [Chart.Aprv(), Chart.Aprv(60, high: 25.7m)], [], "Advisory", "by 2.07 an hour ago" },
        { [Chart.Aprv(), Chart.Aprv(60, high: 25.8m)], [], Clear, "by 1.98" },
        { [Chart.Aprv(), Chart.Aprv(120, high: 27), Chart.Aprv(60, high: 25.7m)], [], "Advisory", "in two changes" },
        { [Chart.Aprv(), Chart.Aprv(120, high: 25), Chart.Aprv(60, high: 28)], [], Clear, "restored" },
        { [Chart.Aprv(), Chart.Aprv(60, tLow: 1.5m)], [], "Advisory", "by a longer T low" },
        { [Chart.Aprv(), Chart.Aprv(240, high: 25)], [], "Advisory", "4 h ago" },
        { [Chart.Aprv(), Chart.Aprv(241, high: 25)], [], Clear, "longer ago" },
        { [Chart.Aprv(), Chart.Aprv(60, high: 25) with { Reason = "oxygen at 0.40" }], [], Clear, "a logged step down" },
        { [Chart.Aprv(), Chart.Aprv(60, high: 25) with { Phase = CoursePhase.Weaning }], [], Clear, "weaning" },
        { [Chart.PressureControl(), Chart.Aprv(60)], [], Clear, "another mode is not compared" },
        { [new SettingChange { ChangedAt = Chart.Ago(60), Mode = VentilationMode.PressureSupport, PressureSupportCmH2O = 8, PeepCmH2O = 5, FiO2 = 0.4m }], [], CannotTell, "not to be computed in this mode" },
        { [], [], CannotTell, "no settings" },
    };

    public static TheoryData<Entry[], Circumstance[], string, string> R54 => new()
    {
        { [Chart.Aprv(900), Chart.Gas(400, 100), Chart.Aprv(200, high: 27), Chart.Gas(60, 80)], [], "Caution", "mean −0.9, P/F −20 %" },
        { [Chart.Aprv(900), Chart.Gas(400, 100), Chart.Aprv(200, high: 27), Chart.Gas(60, 81)], [], Clear, "P/F −19 %" },
        { [Chart.Aprv(900), Chart.Gas(400, 100), Chart.Aprv(200, high: 27.5m), Chart.Gas(60, 80)], [], Clear, "mean −0.45" },
        { [Chart.Aprv(900), Chart.Check(400, spO2: 96), Chart.Aprv(200, high: 27), Chart.Check(60, spO2: 92)], [], "Caution", "SpO2 −4" },
        { [Chart.Aprv(900), Chart.Check(400, spO2: 96), Chart.Aprv(200, high: 27), Chart.Check(60, spO2: 93)], [], Clear, "SpO2 −3" },
        { [Chart.Aprv(900), Chart.Gas(400, 100), Chart.Aprv(300, high: 27), Chart.Gas(60, 80)], [], "Caution", "4 h after the change" },
        { [Chart.Aprv(900), Chart.Gas(400, 100), Chart.Aprv(301, high: 27), Chart.Gas(60, 80)], [], Clear, "later than 4 h" },
        { [Chart.Aprv(900), Chart.Gas(400, 100), Chart.Aprv(200, high: 27), Chart.Aprv(120, high: 28), Chart.Gas(30, 80)], [], Clear, "mean pressure restored" },
        { [Chart.Aprv(900), Chart.Gas(400, 100), Event(300, EventKind.Supine), Chart.Aprv(200, high: 27), Chart.Gas(60, 80)], [], Clear, "the reference lies in another position" },
        { [Chart.Aprv(900), Chart.Gas(400, 100), Chart.Aprv(200, high: 27), Event(70, EventKind.Suction), Chart.Gas(60, 80)], [], CannotTell, "10 min after suction" },
        { [Chart.Aprv(900), Chart.Gas(400, 100), Chart.Aprv(200, high: 27), Chart.Gas(60, 80)], [Circumstance.ComfortCare], CannotTell, "comfort care" },
        { [Chart.Aprv(900), Chart.Check(600, spO2: 96), Chart.Aprv(500, high: 27), Chart.Check(361, spO2: 90)], [], CannotTell, "stale" },
        { [Chart.Aprv(900), Chart.Aprv(200, high: 27)], [], CannotTell, "no reading" },
    };

    [Theory, MemberData(nameof(R05))]
    public void R05_ReleaseVolumeLow(Entry[] chart, Circumstance[] context, string expected, string reason) => Holds("R05", chart, context, expected, reason);

    [Theory, MemberData(nameof(R09))]
    public void R09_ComplianceFalling(Entry[] chart, Circumstance[] context, string expected, string reason) => Holds("R09", chart, context, expected, reason);

    [Theory, MemberData(nameof(R34))]
    public void R34_MeanPressureFell(Entry[] chart, Circumstance[] context, string expected, string reason) => Holds("R34", chart, context, expected, reason);

    [Theory, MemberData(nameof(R54))]
    public void R54_OxygenFellAfterPressure(Entry[] chart, Circumstance[] context, string expected, string reason) => Holds("R54", chart, context, expected, reason);

    [Theory, MemberData(nameof(R24))]
    public void R24_OxygenationWorse(Entry[] chart, Circumstance[] context, string expected, string reason) => Holds("R24", chart, context, expected, reason);

    [Fact]
    public void Sentence_CarriesItsNumbersFirst()
    {
        var finding = Found(new Chart().With(Chart.Aprv(900), Chart.Gas(750, 95), Chart.Gas(30, 75)), "R24");

        Assert.Equal("P/F 190 → 150 in 12 h at mean pressure 26", finding.Says);
    }

    /// <summary>Gases every four hours up to half an hour ago, at FiO2 0.5.</summary>
    private static IEnumerable<BloodGas> Gases(params decimal[] paO2) => paO2.Select((pO2, i) => Chart.Gas(30 + 240 * (paO2.Length - 1 - i), pO2));

    /// <summary>Checks every two hours with the same flows.</summary>
    private static IEnumerable<VentilatorCheck> Releases(params decimal[] millilitres) => millilitres.Select((ml, i) => Chart.Check(490 - 120 * i, release: ml));

    private static BloodGas Acid(decimal pH) => Chart.Gas(pH: pH, bicarbonate: null);
}
