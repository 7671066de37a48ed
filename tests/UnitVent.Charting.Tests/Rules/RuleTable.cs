using UnitVent.Charting.Entries;
using UnitVent.Charting.Rules;

namespace UnitVent.Charting.Tests.Rules;

/// <summary>One table a rule, named by its id: fires, does not fire, both sides of each limit, each quiet condition, missing, stale.</summary>
/// <remarks>A row: what was charted, the circumstances in force, the level or that it is clear or cannot be told, and why.</remarks>
public abstract class RuleTable
{
    protected const string Clear = "clear";
    protected const string CannotTell = "cannot tell";

    protected static void Holds(string rule, Entry[] chart, Circumstance[] context, string expected, string reason)
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

    private protected static Finding Found(Chart chart, string rule) => chart.Picture().Outcomes.OfType<RuleOutcome.Raised>().Single(o => o.Rule == rule).Finding;

    protected static BedsideEvent Event(double minutesAgo, EventKind kind) => new() { At = Chart.Ago(minutesAgo), What = kind };

    protected static MethodChoice Method(SettingMethod method) => new() { Method = method, From = Chart.Ago(1000) };

    protected static TargetSet Target(Func<TargetSet, TargetSet> with) => with(new TargetSet { From = Chart.Ago(1000), Reason = "test" });
}
