using UnitVent.Charting.Entries;

namespace UnitVent.Charting.Tests.Rules;

/// <summary>Limits: N Engl J Med 2000;342:1301 (ladder of pH), else common practice.</summary>
public sealed class CarbonDioxideRuleTests : RuleTable
{
    /// <summary>Gases without a bicarbonate, so that no mismatch holds them back.</summary>
    public static TheoryData<Entry[], Circumstance[], string, string> R21 => new()
    {
        { [Chart.Aprv(), Co2(400, 45, 7.36m), Co2(30, 55, 7.30m)], [], "Caution", "PaCO2 +10" },
        { [Chart.Aprv(), Co2(400, 45, 7.36m), Co2(30, 54, 7.30m)], [], Clear, "PaCO2 +9, pH −0.06" },
        { [Chart.Aprv(), Co2(400, 45, 7.38m), Co2(30, 50, 7.30m)], [], "Caution", "pH −0.08" },
        { [Chart.Aprv(), Co2(400, 45, 7.38m), Co2(30, 50, 7.31m)], [], Clear, "pH −0.07" },
        { [Chart.Aprv(), Co2(500, 44, 7.37m), Co2(400, 45, 7.36m), Co2(300, 60, 7.25m), Co2(30, 55, 7.30m)], [], "Caution", "against the median of three" },
        { [Chart.Aprv(), Co2(400, 55, 7.28m), Co2(30, 66, 7.19m)], [], "Urgent", "pH under 7.20 as well" },
        { [Chart.Aprv(), Co2(400, 55, 7.28m), Co2(30, 66, 7.20m)], [], "Caution", "pH on the urgent edge" },
        { [Chart.Aprv(2000), Co2(1300, 40, 7.40m), Co2(1000, 42, 7.39m), Co2(700, 44, 7.37m), Co2(400, 47, 7.35m), Co2(30, 50, 7.33m)], [], "Caution", "no step, but a drift over five gases" },
        { [Chart.Aprv(2000), Co2(1300, 40, 7.40m), Co2(1000, 42, 7.39m), Co2(700, 41, 7.39m), Co2(400, 40, 7.40m), Co2(30, 42, 7.39m)], [], Clear, "no drift" },
        { [Chart.Aprv(), Co2(400, 28, 7.58m), Co2(30, 38, 7.46m)], [], Clear, "an alkalaemic patient comes back" },
        { [Chart.Aprv(), Co2(400, 28, 7.58m), Co2(30, 38, 7.45m)], [], "Caution", "alkalaemia is over" },
        { [Chart.Aprv(), Event(200, EventKind.RelaxantStart), Co2(400, 45, 7.36m), Co2(30, 55, 7.30m)], [], "Advisory", "a relaxant in between" },
        { [Chart.Aprv(), Chart.Aprv(60, tHigh: 5.5m), Co2(400, 45, 7.36m), Co2(30, 55, 7.30m)], [], CannotTell, "30 min after ventilation was lowered" },
        { [Chart.Aprv(), Chart.Aprv(60, tHigh: 4.0m), Co2(400, 45, 7.36m), Co2(30, 55, 7.30m)], [], "Caution", "30 min after ventilation was raised" },
        { [Chart.Aprv(), Event(40, EventKind.Suction), Co2(400, 45, 7.36m), Co2(30, 55, 7.30m)], [], CannotTell, "10 min after suction" },
        { [Chart.Aprv(), Co2(36, 45, 7.36m), Co2(30, 55, 7.30m)], [], CannotTell, "a repeat after 6 min is no reference" },
        { [Chart.Aprv(), Co2(400, 45, 7.36m), Co2(30, 55, 7.30m) with { BicarbonateMmolL = 36 }], [], CannotTell, "a gas that does not fit itself holds back a caution" },
        { [Chart.Aprv(), Co2(400, 55, 7.28m), Co2(30, 66, 7.19m) with { BicarbonateMmolL = 36 }], [], "Urgent", "urgent beats doubt" },
        { [Chart.Aprv(), Co2(400, 45, 7.36m), Co2(30, 55, 7.30m) with { Specimen = Specimen.Venous }], [], CannotTell, "a venous gas says nothing" },
        { [Chart.Aprv(1000), Co2(800, 45, 7.36m), Co2(30, 55, 7.30m)], [], CannotTell, "the earlier gas lies more than 12 h before" },
        { [Chart.Aprv(2000), Co2(1100, 45, 7.36m), Co2(721, 55, 7.30m)], [], CannotTell, "stale" },
        { [Chart.Aprv(), Co2(400, 45, 7.36m), Co2(30, 55, 7.30m)], [Circumstance.ComfortCare], CannotTell, "comfort care" },
    };

    public static TheoryData<Entry[], Circumstance[], string, string> R22 => new()
    {
        { [Co2(30, 48, 7.25m)], [], Clear, "on the caution edge" },
        { [Co2(30, 48, 7.24m)], [], "Caution", "under 7.25" },
        { [Co2(30, 48, 7.20m)], [], "Caution", "on the urgent edge" },
        { [Co2(30, 48, 7.19m)], [], "Urgent", "under 7.20" },
        { [Co2(30, 40, 7.50m)], [], Clear, "on the upper edge" },
        { [Co2(30, 40, 7.51m)], [], "Caution", "over 7.50" },
        { [Co2(30, 40, 7.55m)], [], "Caution", "on the upper urgent edge" },
        { [Co2(30, 40, 7.56m)], [], "Urgent", "over 7.55" },
        { [Co2(30, 75, 7.21m)], [Circumstance.PermissiveHypercapnia], Clear, "accepted down to 7.20" },
        { [Co2(30, 75, 7.19m)], [Circumstance.PermissiveHypercapnia], "Caution", "under the floor" },
        { [Co2(30, 80, 7.14m)], [Circumstance.PermissiveHypercapnia], "Urgent", "no acceptance goes below 7.15" },
        { [Co2(30, 48, 7.19m)], [Circumstance.PermissiveHypercapnia], "Urgent", "accepted, but the cause is metabolic" },
        { [Co2(30, 75, 7.19m)], [Circumstance.PermissiveHypercapnia, Circumstance.EcmoVv], "Urgent", "not accepted on ECMO" },
        { [Co2(30, 80, 7.17m), Target(t => t with { PHFloor = 7.16m })], [], Clear, "a floor of their own" },
        { [Co2(30, 48, 7.29m), Target(t => t with { PHFloor = 7.30m })], [], "Caution", "a higher floor of their own" },
        { [Co2(30, 48, 7.24m) with { BicarbonateMmolL = 30 }], [], CannotTell, "a gas that does not fit itself holds back a caution" },
        { [Co2(30, 48, 7.14m) with { BicarbonateMmolL = 30 }], [], "Urgent", "urgent beats doubt" },
        { [Co2(721, 48, 7.10m)], [], CannotTell, "stale" },
        { [Co2(30, 48, 7.10m)], [Circumstance.ComfortCare], CannotTell, "comfort care" },
        { [Co2(30, 48, 7.10m) with { Specimen = Specimen.Capillary }], [], CannotTell, "a capillary gas says nothing" },
    };

    public static TheoryData<Entry[], Circumstance[], string, string> R23 => new()
    {
        { [Co2(30, 60, 7.32m)], [], Clear, "on the upper edge" },
        { [Co2(30, 61, 7.32m)], [], "Advisory", "over 60" },
        { [Co2(30, 34, 7.42m)], [], "Advisory", "under 35" },
        { [Co2(30, 80, 7.30m)], [], "Advisory", "on the urgent edge" },
        { [Co2(30, 81, 7.30m)], [], "Urgent", "over 80" },
        { [Co2(30, 24, 7.48m)], [], "Urgent", "under 25" },
        { [Co2(30, 46, 7.36m)], [Circumstance.RaisedIcp], "Caution", "raised intracranial pressure: over 45" },
        { [Co2(30, 45, 7.36m)], [Circumstance.RaisedIcp], Clear, "on its edge" },
        { [Co2(30, 51, 7.33m)], [Circumstance.RaisedIcp], "Urgent", "raised intracranial pressure: over 50" },
        { [Co2(30, 29, 7.45m)], [Circumstance.RaisedIcp], "Urgent", "raised intracranial pressure: under 30" },
        { [Co2(30, 63, 7.36m)], [Circumstance.ChronicRetainer], Clear, "a retainer within 8 of 55" },
        { [Co2(30, 46, 7.42m)], [Circumstance.ChronicRetainer], "Advisory", "too low for a retainer" },
        { [Co2(30, 70, 7.36m), Target(t => t with { PaCO2LowMmHg = 60, PaCO2HighMmHg = 76 })], [Circumstance.ChronicRetainer], Clear, "the band of the patient" },
        { [Co2(721, 90, 7.2m)], [], CannotTell, "stale" },
        { [Co2(30, 90, 7.2m)], [Circumstance.ComfortCare], CannotTell, "comfort care" },
        { [], [], CannotTell, "no gas" },
    };

    public static TheoryData<Entry[], Circumstance[], string, string> R57 => new()
    {
        { [Co2(30, 60, 7.19m) with { Specimen = Specimen.Venous }], [], "Caution", "under 7.20" },
        { [Co2(30, 60, 7.20m) with { Specimen = Specimen.Venous }], [], Clear, "on the edge" },
        { [Co2(30, 60, 7.10m) with { Specimen = Specimen.Venous }, Co2(10, 48, 7.30m)], [], Clear, "an arterial gas came since" },
        { [Co2(200, 48, 7.34m), Co2(30, 60, 7.10m) with { Specimen = Specimen.Venous }], [], "Caution", "a venous gas after an arterial one" },
        { [Co2(30, 60, 7.10m) with { Specimen = Specimen.Capillary }], [], CannotTell, "capillary" },
        { [Co2(721, 60, 7.10m) with { Specimen = Specimen.Venous }], [], CannotTell, "stale" },
        { [Co2(30, 60, 7.10m) with { Specimen = Specimen.Venous }], [Circumstance.ComfortCare], CannotTell, "comfort care" },
    };

    [Theory, MemberData(nameof(R21))]
    public void R21_CarbonDioxideRising(Entry[] chart, Circumstance[] context, string expected, string reason) => Holds("R21", chart, context, expected, reason);

    [Theory, MemberData(nameof(R22))]
    public void R22_PH(Entry[] chart, Circumstance[] context, string expected, string reason) => Holds("R22", chart, context, expected, reason);

    [Theory, MemberData(nameof(R23))]
    public void R23_PaCO2(Entry[] chart, Circumstance[] context, string expected, string reason) => Holds("R23", chart, context, expected, reason);

    [Theory, MemberData(nameof(R57))]
    public void R57_VenousPH(Entry[] chart, Circumstance[] context, string expected, string reason) => Holds("R57", chart, context, expected, reason);

    [Fact]
    public void RisingCarbonDioxide_NamesThePartThatFell()
    {
        var chart = new Chart().With(
            Chart.Aprv(), Co2(400, 45, 7.36m), Chart.Check(395) with { TotalMinuteVolumeLMin = 7.0m }, Co2(30, 57, 7.29m), Chart.Check(25) with { TotalMinuteVolumeLMin = 5.0m });

        Assert.Equal("PaCO2 45 → 57 mmHg, pH 7.36 → 7.29 in 6.2 h; own breaths 2.4 → 0.4 L/min", Found(chart, "R21").Says);
    }

    [Fact]
    public void FallingPH_WithBaseExcessFallen_NamesTheMetabolicPart() =>
        Assert.Contains("; metabolic part: base excess", Found(new Chart().With(Chart.Aprv(), Co2(400, 45, 7.38m), Co2(30, 44, 7.28m)), "R21").Says);

    private static BloodGas Co2(double minutesAgo, decimal mmHg, decimal pH) => Chart.Gas(minutesAgo, pCO2: mmHg, pH: pH, bicarbonate: null);
}
