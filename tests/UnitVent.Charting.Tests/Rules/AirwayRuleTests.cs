using UnitVent.Charting.Entries;

namespace UnitVent.Charting.Tests.Rules;

/// <summary>Limits: common practice.</summary>
public sealed class AirwayRuleTests : RuleTable
{
    // With T low 0.5 s a time constant τ leaves 100 e^(−0.5/τ) % of the peak flow: τ = 1, 1.096, 1.192 … s.
    public static TheoryData<Entry[], Circumstance[], string, string> R59 => new()
    {
        { [Chart.Aprv(), .. Checks(60.65m, 63.37m, 65.74m, 67.83m, 69.69m)], [], "Caution", "τ +0.38 s from a median of 1.10 s, just over 35 %" },
        { [Chart.Aprv(), .. Checks(60.65m, 63.36m, 65.73m, 67.81m, 69.66m)], [], Clear, "just under 35 %" },
        { [Chart.Aprv(), .. Checks(50, 56, 63, 70)], [], "Advisory", "four checks: a drift, but not a sure one" },
        { [Chart.Aprv(), .. Checks(67, 65, 63, 61, 60)], [], Clear, "falling" },
        { [Chart.Aprv(), .. Checks(60, 66, 62, 70, 64)], [], Clear, "no order in time" },
        { [Chart.Aprv(), .. Checks(50, 60, 70)], [], CannotTell, "three checks" },
        { [Chart.Aprv(), .. Checks(50, 55, 60, 65, 70), Chart.Aprv(300, tHigh: 5)], [], CannotTell, "T high was changed in the window" },
        { [Chart.Aprv(), .. Checks(50, 55, 60, 65, 70), Chart.Aprv(300, fiO2: 0.6m)], [], "Caution", "FiO2 does not matter to it" },
        { [Chart.Aprv(), .. Checks(50, 55, 60, 91, 92)], [], CannotTell, "end-release flow over 90 % does not count" },
        { [Chart.Aprv(), .. Checks(50, 55, 60, 65, 70).Select(c => c with { EffortDuringRelease = true })], [], CannotTell, "effort during the releases" },
        { [Chart.Aprv(), .. Checks(50, 55, 60, 65, 70), Chart.Check(8, peak: null, end: null)], [], "Caution", "a check without flows in between" },
        { [Chart.Aprv(1000), .. Checks(50, 55, 60, 65, 70).Select(c => c with { ObservedAt = c.ObservedAt - NodaTime.Duration.FromHours(6) })], [], CannotTell, "stale" },
        { [Chart.PressureControl(), .. Checks(50, 55, 60, 65, 70)], [], CannotTell, "another mode" },
        { [], [], CannotTell, "nothing charted" },
    };

    [Theory, MemberData(nameof(R59))]
    public void R59_TimeConstantRising(Entry[] chart, Circumstance[] context, string expected, string reason) => Holds("R59", chart, context, expected, reason);

    [Fact]
    public void Sentence_CarriesItsNumbersFirst() => Assert.Equal(
        "time constant 0.84 → 1.40 s in 8.0 h, 5 checks at the same settings; release ended at 70 % of peak",
        Found(new Chart().With([Chart.Aprv(), .. Checks(50, 55, 60, 65, 70)]), "R59").Says);

    private static IEnumerable<VentilatorCheck> Checks(params decimal[] endPercent) => endPercent.Select((end, i) => Chart.Check(490 - 120 * i, peak: 100, end: end));
}
