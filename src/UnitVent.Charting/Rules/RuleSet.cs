using UnitVent.Charting.Rules.Collapse;
using UnitVent.Charting.Rules.Due;
using UnitVent.Charting.Rules.Oxygen;
using UnitVent.Charting.Rules.Slips;
using UnitVent.Charting.Rules.Sudden;
using UnitVent.Charting.Rules.Timing;
using UnitVent.Charting.Rules.Volumes;

namespace UnitVent.Charting.Rules;

/// <summary>Every rule, once.</summary>
public static class RuleSet
{
    /// <summary>Gets the rules in order of their ids.</summary>
    public static IReadOnlyList<Rule> All { get; } =
    [
        new ReleasedLongRule(),
        new ReleaseVolumeHighRule(),
        new GasDoesNotFitRule(),
        new NotKnownRule(),
        new OxygenationWorseRule(),
        new LowOxygenRule(),
        new CheckDueRule(),
        new SuddenChangeRule(),
    ];

    /// <summary>The rule with an id.</summary>
    /// <exception cref="InvalidOperationException">There is none.</exception>
    public static Rule Of(string id) => All.First(r => r.Id == id);
}
