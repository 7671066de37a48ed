using UnitVent.Charting.Entries;

namespace UnitVent.Charting.Tests.Rules;

/// <summary>Limits: common practice.</summary>
public sealed class SuddenRuleTests : RuleTable
{
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

    [Theory, MemberData(nameof(R56))]
    public void R56_SuddenChange(Entry[] chart, Circumstance[] context, string expected, string reason) => Holds("R56", chart, context, expected, reason);
}
