using UnitVent.Charting.Entries;

namespace UnitVent.Charting.Tests.Rules;

/// <summary>Limits: N Engl J Med 2000;342:1301.</summary>
public sealed class OxygenRuleTests : RuleTable
{
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

    public static TheoryData<Entry[], Circumstance[], string, string> R26 => new()
    {
        { [Chart.Aprv(), Chart.Check(150, spO2: 97), Chart.Check(30, spO2: 97)], [], "Advisory", "two readings over 2 h" },
        { [Chart.Aprv(), Chart.Check(149, spO2: 97), Chart.Check(30, spO2: 97)], [], Clear, "not yet 2 h" },
        { [Chart.Aprv(), Chart.Check(300, spO2: 97), Chart.Check(30, spO2: 96)], [], Clear, "the latest is on the edge" },
        { [Chart.Aprv(), Chart.Check(300, spO2: 98), Chart.Check(200, spO2: 95), Chart.Check(30, spO2: 98)], [], Clear, "one in between was not" },
        { [Chart.Aprv(fiO2: 0.4m), Chart.Check(300, spO2: 99), Chart.Check(30, spO2: 99)], [], Clear, "FiO2 0.40" },
        { [Chart.Aprv(), Chart.Check(300, spO2: 95), Chart.Check(30, spO2: 95), Target(t => t with { SpO2HighPercent = 92 })], [], "Advisory", "above the patient's target" },
        { [Chart.Aprv(), Chart.Gas(300, 101), Chart.Gas(30, 101)], [], "Advisory", "two gases" },
        { [Chart.Aprv(), Chart.Gas(300, 100), Chart.Gas(30, 101)], [], Clear, "the earlier gas on the edge" },
        { [Chart.Aprv(), Chart.Gas(30, 150)], [], Clear, "150 once" },
        { [Chart.Aprv(), Chart.Gas(30, 151)], [], "Advisory", "over 150 once" },
        { [Chart.Aprv(), Chart.Gas(30, 151)], [Circumstance.ComfortCare], CannotTell, "comfort care" },
        { [Chart.Aprv(), Chart.Check(700, spO2: 99), Chart.Check(361, spO2: 99)], [], CannotTell, "stale" },
    };

    public static TheoryData<Entry[], Circumstance[], string, string> R55 => new()
    {
        { [Chart.Aprv(900, fiO2: 0.4m), Chart.Aprv(300, fiO2: 0.5m), Chart.Aprv(60, fiO2: 0.6m), Chart.Check()], [], "Caution", "0.40 to 0.60 in two steps" },
        { [Chart.Aprv(900, fiO2: 0.4m), Chart.Aprv(60, fiO2: 0.59m), Chart.Check(spO2: 98)], [], CannotTell, "+0.19, and S/F says nothing over 97 %" },
        { [Chart.Aprv(900, fiO2: 0.4m), Chart.Aprv(490, fiO2: 0.5m), Chart.Aprv(60, fiO2: 0.6m), Chart.Check()], [], Clear, "0.10 within 8 h" },
        { [Chart.Aprv(), Chart.Check(400, spO2: 97), Chart.Check(300, spO2: 97), Chart.Check(20, spO2: 78)], [], Clear, "S/F −19.6 %" },
        { [Chart.Aprv(), Chart.Check(400, spO2: 97), Chart.Check(300, spO2: 97), Chart.Check(20, spO2: 77)], [], "Caution", "S/F −20.6 %" },
        { [Chart.Aprv(900, fiO2: 0.4m), Chart.Aprv(200, fiO2: 0.5m), Chart.Check(400, spO2: 94), Chart.Check(20, spO2: 94)], [], "Caution", "S/F −20 % by FiO2" },
        { [Chart.Aprv(900, fiO2: 0.4m), Chart.Aprv(60, fiO2: 1.0m), Event(20, EventKind.Bronchoscopy), Chart.Check()], [], Clear, "before a bronchoscopy" },
        { [Chart.Aprv(900, fiO2: 0.4m), Chart.Aprv(60, fiO2: 1.0m), Event(200, EventKind.Bronchoscopy), Chart.Check()], [], "Caution", "a bronchoscopy hours before" },
        { [Chart.Aprv(900, fiO2: 0.4m), Chart.Aprv(60, fiO2: 1.0m)], [Circumstance.ComfortCare], CannotTell, "comfort care" },
        { [Chart.Aprv(900), Chart.Check(361, spO2: 70)], [], CannotTell, "stale" },
        { [Chart.Check()], [], CannotTell, "no settings" },
    };

    public static TheoryData<Entry[], Circumstance[], string, string> R58 => new()
    {
        { [Chart.Aprv(2000), .. Falling(96, 95, 94, 93)], [], "Caution", "3 points over four checks" },
        { [Chart.Aprv(2000), .. Falling(96, 95, 95, 94)], [], Clear, "2 points" },
        { [Chart.Aprv(2000), .. Falling(93, 94, 95, 96)], [], Clear, "rising" },
        { [Chart.Aprv(2000), .. Falling(96, 94, 93)], [], CannotTell, "three checks" },
        { [Chart.Aprv(2000), Chart.Aprv(500, fiO2: 0.4m), .. Falling(96, 95, 94, 93)], [], Clear, "FiO2 was lowered" },
        { [Chart.Aprv(2000), Chart.Aprv(500, fiO2: 0.6m), .. Falling(96, 95, 94, 93)], [], "Caution", "although FiO2 was raised" },
        { [Chart.Aprv(2000), Chart.Aprv(500, high: 27), .. Falling(96, 95, 94, 93)], [], Clear, "mean pressure was lowered" },
        { [Chart.Aprv(2000), Chart.Aprv(1000, high: 27), .. Falling(96, 95, 94, 93)], [], "Caution", "mean pressure was lowered before all of them" },
        { [Chart.Aprv(2000), Event(500, EventKind.Prone), .. Falling(96, 95, 94, 93)], [], Clear, "turned in between" },
        { [Chart.Aprv(2000), .. Falling(96, 95, 94, 93)], [Circumstance.ComfortCare], CannotTell, "comfort care" },
        { [Chart.Aprv(2000), Chart.Check(1300, spO2: 97), Chart.Check(1000, spO2: 95), Chart.Check(700, spO2: 93), Chart.Check(361, spO2: 91)], [], CannotTell, "stale" },
    };

    [Theory, MemberData(nameof(R25))]
    public void R25_LowOxygen(Entry[] chart, Circumstance[] context, string expected, string reason) => Holds("R25", chart, context, expected, reason);

    [Theory, MemberData(nameof(R26))]
    public void R26_OxygenAboveTarget(Entry[] chart, Circumstance[] context, string expected, string reason) => Holds("R26", chart, context, expected, reason);

    [Theory, MemberData(nameof(R55))]
    public void R55_CreepingFiO2(Entry[] chart, Circumstance[] context, string expected, string reason) => Holds("R55", chart, context, expected, reason);

    [Theory, MemberData(nameof(R58))]
    public void R58_SaturationFalling(Entry[] chart, Circumstance[] context, string expected, string reason) => Holds("R58", chart, context, expected, reason);

    /// <summary>Checks four hours apart, the last half an hour ago.</summary>
    private static VentilatorCheck[] Falling(params int[] spO2) => [.. spO2.Select((percent, i) => Chart.Check(30 + 240 * (spO2.Length - 1 - i), spO2: percent))];
}
