using UnitVent.Charting.Rules.CarbonDioxide;
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
        new MeanPressuresDifferRule(),
        new GasDoesNotFitRule(),
        new OxygenDoesNotFitRule(),
        new NotKnownRule(),
        new VolumesDoNotAddUpRule(),
        new CarbonDioxideRisingRule(),
        new PHRule(),
        new PaCO2Rule(),
        new OxygenationWorseRule(),
        new LowOxygenRule(),
        new OxygenAboveTargetRule(),
        new CheckDueRule(),
        new CreepingFiO2Rule(),
        new SuddenChangeRule(),
        new VenousPHRule(),
        new SaturationFallingRule(),
    ];

    /// <summary>The rule with an id.</summary>
    /// <exception cref="InvalidOperationException">There is none.</exception>
    public static Rule Of(string id) => All.First(r => r.Id == id);
}
