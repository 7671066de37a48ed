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
        { [Chart.Aprv(), Chart.Gas(30, 80)], [], CannotTell, "no earlier gas" },
        { [Chart.Aprv(), Chart.Gas(400, 100), Chart.Gas(30, 80) with { Specimen = Specimen.Venous }], [], CannotTell, "a venous gas says nothing" },
    };

    [Theory, MemberData(nameof(R24))]
    public void R24_OxygenationWorse(Entry[] chart, Circumstance[] context, string expected, string reason) => Holds("R24", chart, context, expected, reason);

    [Fact]
    public void Sentence_CarriesItsNumbersFirst()
    {
        var finding = Found(new Chart().With(Chart.Aprv(900), Chart.Gas(750, 95), Chart.Gas(30, 75)), "R24");

        Assert.Equal("P/F 190 → 150 in 12 h at mean pressure 26", finding.Says);
    }
}
