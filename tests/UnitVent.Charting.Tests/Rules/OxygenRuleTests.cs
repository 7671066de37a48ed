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

    [Theory, MemberData(nameof(R25))]
    public void R25_LowOxygen(Entry[] chart, Circumstance[] context, string expected, string reason) => Holds("R25", chart, context, expected, reason);
}
