using UnitVent.Charting.Rules.Airway;
using UnitVent.Charting.Rules.CarbonDioxide;
using UnitVent.Charting.Rules.Circulation;
using UnitVent.Charting.Rules.Collapse;
using UnitVent.Charting.Rules.Drive;
using UnitVent.Charting.Rules.Due;
using UnitVent.Charting.Rules.Liberation;
using UnitVent.Charting.Rules.Oxygen;
using UnitVent.Charting.Rules.Slips;
using UnitVent.Charting.Rules.StepDown;
using UnitVent.Charting.Rules.Sudden;
using UnitVent.Charting.Rules.Timing;
using UnitVent.Charting.Rules.Volumes;
using UnitVent.Charting.Rules.WorkOfBreathing;

namespace UnitVent.Charting.Rules;

/// <summary>Every rule, once.</summary>
public static class RuleSet
{
    /// <summary>Gets the rules in order of their ids.</summary>
    public static IReadOnlyList<Rule> All { get; } =
    [
        new ReleasedLongRule(),
        new ReleasedShortRule(),
        new TimeLowRule(),
        new ReleaseVolumeHighRule(),
        new ReleaseVolumeLowRule(),
        new PHighRule(),
        new ReleaseRateRule(),
        new ShareAtPHighRule(),
        new ComplianceFallingRule(),
        new PressureLowHoldsRule(),
        new MeanPressuresDifferRule(),
        new GasDoesNotFitRule(),
        new OxygenDoesNotFitRule(),
        new NotKnownRule(),
        new VolumesDoNotAddUpRule(),
        new OwnShareLowRule(),
        new OwnShareHighRule(),
        new FastAndLabouringRule(),
        new LargeOwnBreathsRule(),
        new RelaxantBegunRule(),
        new CarbonDioxideRisingRule(),
        new PHRule(),
        new PaCO2Rule(),
        new OxygenationWorseRule(),
        new LowOxygenRule(),
        new OxygenAboveTargetRule(),
        new TubeCompensationOffRule(),
        new DeepSedationRule(),
        new AgitatedRule(),
        new ChangeUnansweredRule(),
        new CheckDueRule(),
        new PlateauDueRule(),
        new MeanPressureFellRule(),
        new StepWithoutTimeRule(),
        new LargeStepRule(),
        new CpapLevelRule(),
        new TrialScreenRule(),
        new TrialOutcomeRule(),
        new TrialOxygenRule(),
        new TidalVolumeHighRule(),
        new PlateauHighRule(),
        new DrivingPressureHighRule(),
        new TrappedPressureRule(),
        new SupportUnsettledRule(),
        new LowPressureRule(),
        new BaselineDueRule(),
        new MinuteVolumeFellRule(),
        new OxygenFellAfterPressureRule(),
        new CreepingFiO2Rule(),
        new SuddenChangeRule(),
        new VenousPHRule(),
        new SaturationFallingRule(),
        new TimeConstantRisingRule(),
    ];

    private static Dictionary<string, Rule> ById => field ??= All.ToDictionary(r => r.Id);

    /// <summary>The rule with an id; null for one that was dropped since it raised a flag.</summary>
    public static Rule? Find(string id) => ById.GetValueOrDefault(id);

    /// <summary>The rule with an id.</summary>
    /// <exception cref="KeyNotFoundException">There is none.</exception>
    public static Rule Of(string id) => ById[id];
}
