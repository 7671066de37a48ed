using UnitVent.Charting.Entries;
using UnitVent.Charting.Rules;

namespace UnitVent.Charting.Tests.Rules;

/// <summary>One table a rule: fires, does not fire, both sides of each limit, each quiet condition, missing, stale.</summary>
/// <remarks>The limits are those of the options' sources; where an option names none it is common practice.</remarks>
public sealed class RuleTests
{
    private const string Clear = "clear";
    private const string CannotTell = "cannot tell";

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

    public static TheoryData<Entry[], Circumstance[], string, string> R04 => new()
    {
        // Male 175 cm: 70.566 kg, so 8, 10 and 12 mL/kg are 564.5, 705.7 and 846.8 mL.
        { [Chart.Aprv(), Chart.Check(release: 564)], [], Clear, "just under 8 mL/kg" },
        { [Chart.Aprv(), Chart.Check(release: 565)], [], "Advisory", "just over 8" },
        { [Chart.Aprv(), Chart.Check(release: 705)], [], "Advisory", "just under 10" },
        { [Chart.Aprv(), Chart.Check(release: 706)], [], "Caution", "just over 10" },
        { [Chart.Aprv(), Chart.Check(release: 847)], [], "Urgent", "just over 12" },
        { [Chart.Aprv(high: 35, low: 0), Chart.Check(peak: 100, end: 57, release: 400)], [], "Caution", "swing 15.05" },
        { [Chart.Aprv(high: 35, low: 0), Chart.Check(peak: 100, end: 58, release: 400)], [], Clear, "swing 14.7" },
        { [Chart.Aprv(), Chart.Check(release: 706) with { ReleasesAveraged = 1 }], [], "Advisory", "one release is one level lower" },
        { [Chart.Aprv(), Chart.Check(release: 706)], [Circumstance.EcmoVv], CannotTell, "ECMO" },
        { [Chart.Aprv(), Chart.Check(release: 706)], [Circumstance.AirLeak], CannotTell, "air leak" },
        { [Chart.Aprv(), Chart.Check(release: null)], [], CannotTell, "no release volume" },
        { [Chart.Aprv(), Chart.Check(361, release: 706)], [], CannotTell, "stale" },
    };

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

    public static TheoryData<Entry[], Circumstance[], string, string> R17 => new()
    {
        { [Chart.Aprv(), Chart.Gas(), Chart.Check()], [], Clear, "all fresh" },
        { [Chart.Aprv(), Chart.Gas(), Chart.Check(360)], [], Clear, "a check exactly at 6 h" },
        { [Chart.Aprv(), Chart.Gas(), Chart.Check(361)], [], "Advisory", "a check past 6 h" },
        { [Chart.Aprv(800), Chart.Gas(), Chart.Check(721)], [], "Caution", "a check past 12 h" },
        { [Chart.Aprv(), Chart.Gas(720), Chart.Check()], [], Clear, "a gas exactly at 12 h" },
        { [Chart.Aprv(), Chart.Gas(721), Chart.Check()], [], "Advisory", "a gas past 12 h" },
        { [Chart.Aprv(2000) with { Phase = CoursePhase.Weaning }, Chart.Gas(1440), Chart.Check()], [], Clear, "weaning: a gas at 24 h" },
        { [Chart.Aprv(721), Chart.Gas(), Chart.Check() with { SettingsConfirmed = null }], [], "Advisory", "settings unconfirmed past 12 h" },
        { [Chart.Aprv(721), Chart.Gas(), Chart.Check()], [], Clear, "settings confirmed by the check" },
        { [], [], "Caution", "nothing charted for three days" },
        { [Event(60, EventKind.TransportOut)], [], CannotTell, "in transport" },
        { [Event(90, EventKind.TransportOut), Event(60, EventKind.TransportBack)], [], "Caution", "back from transport" },
        { [], [Circumstance.ComfortCare], CannotTell, "comfort care" },
    };

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
        { [Chart.Aprv(), Chart.Gas(30, 80)], [], CannotTell, "no earlier gas" },
        { [Chart.Aprv(), Chart.Gas(400, 100), Chart.Gas(30, 80) with { Specimen = Specimen.Venous }], [], CannotTell, "a venous gas says nothing" },
    };

    /// <summary>Edges 88 % and 55 mmHg: N Engl J Med 2000;342:1301.</summary>
    public static TheoryData<Entry[], Circumstance[], string, string> R25 => new()
    {
        { [Chart.Aprv(), Chart.Check(spO2: 88)], [], Clear, "on the edge" },
        { [Chart.Aprv(), Chart.Check(spO2: 87)], [], "Urgent", "under 88" },
        { [Chart.Aprv(), Chart.Gas(pO2: 55)], [], Clear, "on the edge" },
        { [Chart.Aprv(), Chart.Gas(pO2: 54)], [], "Urgent", "under 55 mmHg" },
        { [Chart.Aprv(), Chart.Check(spO2: 91), Target(t => t with { SpO2LowPercent = 92 })], [], "Caution", "under the patient's target" },
        { [Chart.Aprv(), Chart.Check(spO2: 86), Target(t => t with { SpO2LowPercent = 85 })], [], Clear, "a lower target holds" },
        { [Chart.Aprv(), Chart.Check(spO2: 79), Target(t => t with { SpO2LowPercent = 75 })], [], "Urgent", "no target goes below 80" },
        { [Chart.Aprv(), Chart.Check(spO2: 85)], [Circumstance.EcmoVv], Clear, "ECMO: edge 80" },
        { [Chart.Aprv(), Chart.Check(spO2: 79)], [Circumstance.EcmoVv], "Urgent", "ECMO: under 80" },
        { [Chart.Aprv(), Chart.Check(spO2: 80)], [Circumstance.ComfortCare], CannotTell, "comfort care" },
        { [Chart.Aprv(), Chart.Check(361, spO2: 80)], [], CannotTell, "stale" },
        { [Chart.Aprv(), Chart.Gas(pO2: 40) with { Specimen = Specimen.Venous }], [], CannotTell, "a venous gas says nothing" },
        { [Chart.Aprv()], [], CannotTell, "nothing charted" },
    };

    public static TheoryData<Entry[], Circumstance[], string, string> R32 => new()
    {
        { [Chart.Aprv(), Chart.Check(299)], [], Clear, "under 5 h at a 4 h interval" },
        { [Chart.Aprv(), Chart.Check(300)], [], "Advisory", "5 h" },
        { [Chart.Aprv(), Chart.Check(479)], [], "Advisory", "under 8 h" },
        { [Chart.Aprv(), Chart.Check(480)], [], "Caution", "8 h" },
        { [Chart.Aprv(), Chart.Check(480), Event(60, EventKind.OffVentilatorStart)], [], CannotTell, "off the ventilator" },
        { [Chart.Aprv(), Chart.Check(480)], [Circumstance.ComfortCare], CannotTell, "comfort care" },
    };

    public static TheoryData<Entry[], Circumstance[], string, string> R56 => new()
    {
        { [Chart.Check(200, spO2: 95, map: 80), Chart.Check(20, spO2: 90, map: 65)], [], "Urgent", "SpO2 −5 with MAP −15" },
        { [Chart.Check(200, spO2: 95, map: 80), Chart.Check(20, spO2: 91, map: 65)], [], Clear, "SpO2 −4" },
        { [Chart.Check(200, spO2: 95, map: 80), Chart.Check(20, spO2: 90, map: 66)], [], Clear, "MAP −14, volume kept" },
        { [Chart.Check(200, spO2: 95, release: 400), Chart.Check(20, spO2: 90, release: 300)], [], "Urgent", "SpO2 −5 with volume −25 %" },
        { [Chart.Check(200, spO2: 95, release: 400), Chart.Check(20, spO2: 90, release: 301)], [], Clear, "volume −24.75 %" },
        { [Chart.Check(20, spO2: 85, map: 50)], [], CannotTell, "one check only" },
        { [Chart.Check(500, spO2: 95, map: 80), Chart.Check(361, spO2: 85, map: 50)], [], CannotTell, "stale" },
    };

    [Theory, MemberData(nameof(R01))]
    public void R01_ReleasedLong(Entry[] chart, Circumstance[] context, string expected, string reason) => Holds("R01", chart, context, expected, reason);

    [Theory, MemberData(nameof(R04))]
    public void R04_ReleaseVolumeHigh(Entry[] chart, Circumstance[] context, string expected, string reason) => Holds("R04", chart, context, expected, reason);

    [Theory, MemberData(nameof(R14))]
    public void R14_GasDoesNotFit(Entry[] chart, Circumstance[] context, string expected, string reason) => Holds("R14", chart, context, expected, reason);

    [Theory, MemberData(nameof(R17))]
    public void R17_NotKnown(Entry[] chart, Circumstance[] context, string expected, string reason) => Holds("R17", chart, context, expected, reason);

    [Theory, MemberData(nameof(R24))]
    public void R24_OxygenationWorse(Entry[] chart, Circumstance[] context, string expected, string reason) => Holds("R24", chart, context, expected, reason);

    [Theory, MemberData(nameof(R25))]
    public void R25_LowOxygen(Entry[] chart, Circumstance[] context, string expected, string reason) => Holds("R25", chart, context, expected, reason);

    [Theory, MemberData(nameof(R32))]
    public void R32_CheckDue(Entry[] chart, Circumstance[] context, string expected, string reason) => Holds("R32", chart, context, expected, reason);

    [Theory, MemberData(nameof(R56))]
    public void R56_SuddenChange(Entry[] chart, Circumstance[] context, string expected, string reason) => Holds("R56", chart, context, expected, reason);

    [Fact]
    public void EveryRule_IsTabledHere() =>
        Assert.All(RuleSet.All, rule => Assert.NotNull(typeof(RuleTests).GetProperty(rule.Id)));

    [Fact]
    public void EstimatedHeight_LowersReleaseVolumeByOneLevel()
    {
        var chart = new Chart().With(Chart.Aprv(), Chart.Check(release: 706));
        chart.Patient = chart.Patient with { HeightEstimated = true };

        Assert.Equal(Severity.Advisory, Found(chart, "R04").Severity);
    }

    [Fact]
    public void Sentence_CarriesItsNumbersFirst()
    {
        var finding = Found(new Chart().With(Chart.Aprv(900), Chart.Gas(750, 95), Chart.Gas(30, 75)), "R24");

        Assert.Equal("P/F 190 → 150 in 12 h at mean pressure 26", finding.Says);
    }

    /// <summary>The imperatives that no message may use: a tool states, it does not order.</summary>
    [Fact]
    public void NoFinding_TellsAnyoneWhatToDo()
    {
        string[] forbidden = ["give", "start", "stop", "increase", "decrease", "raise", "lower", "set", "change", "switch", "wean", "extubate", "intubate", "sedate"];
        Entry[][] charts = [.. R01.Concat(R04).Concat(R14).Concat(R17).Concat(R24).Concat(R25).Concat(R32).Concat(R56).Select(row => row.Data.Item1)];
        var findings = charts.SelectMany(c => new Chart().With(c).Picture().Outcomes.OfType<RuleOutcome.Raised>()).Select(o => o.Finding).ToList();

        Assert.Equal(RuleSet.All.Count, findings.Select(f => f.Rule).Distinct().Count());
        Assert.All(findings, f => Assert.DoesNotContain((f.Says + " " + f.LookAt).ToLowerInvariant().Split(' ', ',', ';', ':', '.'), word => forbidden.Contains(word)));
    }

    private static void Holds(string rule, Entry[] chart, Circumstance[] context, string expected, string reason)
    {
        var outcome = new Chart().With(chart).InContext(context).Picture().Outcomes.Single(o => o.Rule == rule);
        var actual = outcome switch
        {
            RuleOutcome.Raised raised => raised.Finding.Severity.ToString(),
            RuleOutcome.Clear => Clear,
            _ => CannotTell,
        };
        Assert.True(expected == actual, $"{reason}: expected {expected}, got {outcome}");
    }

    private static Finding Found(Chart chart, string rule) => chart.Picture().Outcomes.OfType<RuleOutcome.Raised>().Single(o => o.Rule == rule).Finding;

    private static BedsideEvent Event(double minutesAgo, EventKind kind) => new() { At = Chart.Ago(minutesAgo), What = kind };

    private static MethodChoice Method(SettingMethod method) => new() { Method = method, From = Chart.Ago(1000) };

    private static TargetSet Target(Func<TargetSet, TargetSet> with) => with(new TargetSet { From = Chart.Ago(1000), Reason = "test" });
}
