using UnitVent.Charting.Entries;

namespace UnitVent.Charting.Tests.Rules;

/// <summary>Limits: common practice.</summary>
public sealed class CirculationRuleTests : RuleTable
{
    /// <summary>At T high 4.5 s and T low 0.5 s mean airway pressure is 0.9 P high + 0.1 P low.</summary>
    public static TheoryData<Entry[], Circumstance[], string, string> R47 => new()
    {
        { [Chart.Aprv(), Chart.Check(map: 64)], [], "Caution", "64 mmHg on a mean airway pressure of 25.7" },
        { [Chart.Aprv(), Chart.Check(map: 65)], [], Clear, "65 mmHg" },
        { [Chart.Aprv(), Chart.Check(map: 60)], [], "Caution", "60 mmHg" },
        { [Chart.Aprv(), Chart.Check(map: 59)], [], "Urgent", "59 mmHg" },
        { [Chart.Aprv(high: 22, low: 2), Chart.Check(map: 59)], [], "Urgent", "on a mean airway pressure of exactly 20" },
        { [Chart.Aprv(high: 22, low: 1), Chart.Check(map: 59)], [], Clear, "on a mean airway pressure of 19.9" },
        { [Chart.Aprv(), Chart.Check(map: 80) with { Vasopressor = Vasopressor.Rising }], [], "Caution", "vasopressor rising" },
        { [Chart.Aprv(), Chart.Check(map: 80) with { Vasopressor = Vasopressor.Stable }], [], Clear, "vasopressor stable" },
        { [Chart.Aprv(), Chart.Check(map: null) with { Vasopressor = Vasopressor.Rising }], [], "Caution", "vasopressor rising, pressure not charted" },
        { [Chart.Aprv(), Chart.Check(map: 62), Target(t => t with { MeanArterialPressureMmHg = 60 })], [], Clear, "a lower target" },
        { [Chart.Aprv(), Chart.Check(map: 59), Target(t => t with { MeanArterialPressureMmHg = 60 })], [], "Caution", "under the lower target" },
        { [Chart.Aprv(), Chart.Check(map: 54), Target(t => t with { MeanArterialPressureMmHg = 60 })], [], "Urgent", "5 mmHg under the lower target" },
        { [Chart.Aprv(), Chart.Check(map: 70), Target(t => t with { MeanArterialPressureMmHg = 75 })], [], Clear, "a higher target moves nothing" },
        { [Chart.Aprv(), Chart.Check(361, map: 50)], [], CannotTell, "stale" },
        { [Chart.Aprv(), Chart.Check(map: null)], [], CannotTell, "not charted" },
        { [Chart.Check(map: 50)], [], CannotTell, "no mean airway pressure" },
    };

    [Theory, MemberData(nameof(R47))]
    public void R47_LowPressure(Entry[] chart, Circumstance[] context, string expected, string reason) => Holds("R47", chart, context, expected, reason);
}
