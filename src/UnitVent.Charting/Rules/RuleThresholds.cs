namespace UnitVent.Charting.Rules;

/// <summary>The unit's thresholds. Each has a default with its source; values without a printed source are common practice.</summary>
public sealed record RuleThresholds
{
    /// <summary>Gets R01's thresholds.</summary>
    [OfRule("R01")]
    public Timing.ReleasedLongOptions ReleasedLong { get; init; } = new();

    /// <summary>Gets R02's thresholds.</summary>
    [OfRule("R02")]
    public Timing.ReleasedShortOptions ReleasedShort { get; init; } = new();

    /// <summary>Gets R03's thresholds.</summary>
    [OfRule("R03")]
    public Timing.TimeLowOptions TimeLow { get; init; } = new();

    /// <summary>Gets R04's thresholds.</summary>
    [OfRule("R04")]
    public Volumes.ReleaseVolumeHighOptions ReleaseVolumeHigh { get; init; } = new();

    /// <summary>Gets R05's thresholds.</summary>
    [OfRule("R05")]
    public Collapse.ReleaseVolumeLowOptions ReleaseVolumeLow { get; init; } = new();

    /// <summary>Gets R06's thresholds.</summary>
    [OfRule("R06")]
    public Volumes.PHighOptions PHigh { get; init; } = new();

    /// <summary>Gets R07's thresholds.</summary>
    [OfRule("R07")]
    public Timing.ReleaseRateOptions ReleaseRate { get; init; } = new();

    /// <summary>Gets R08's thresholds.</summary>
    [OfRule("R08")]
    public Timing.ShareAtPHighOptions ShareAtPHigh { get; init; } = new();

    /// <summary>Gets R09's thresholds.</summary>
    [OfRule("R09")]
    public Collapse.ComplianceFallingOptions ComplianceFalling { get; init; } = new();

    /// <summary>Gets R11's thresholds.</summary>
    [OfRule("R11")]
    public Timing.PressureLowHoldsOptions PressureLowHolds { get; init; } = new();

    /// <summary>Gets R13's thresholds.</summary>
    [OfRule("R13")]
    public Slips.MeanPressuresDifferOptions MeanPressuresDiffer { get; init; } = new();

    /// <summary>Gets R16's thresholds.</summary>
    [OfRule("R16")]
    public Slips.OxygenDoesNotFitOptions OxygenDoesNotFit { get; init; } = new();

    /// <summary>Gets R18's thresholds.</summary>
    [OfRule("R18")]
    public Slips.VolumesDoNotAddUpOptions VolumesDoNotAddUp { get; init; } = new();

    /// <summary>Gets R19a's thresholds.</summary>
    [OfRule("R19a")]
    public Drive.OwnShareLowOptions OwnShareLow { get; init; } = new();

    /// <summary>Gets R19b's thresholds.</summary>
    [OfRule("R19b")]
    public WorkOfBreathing.OwnShareHighOptions OwnShareHigh { get; init; } = new();

    /// <summary>Gets R19c's thresholds.</summary>
    [OfRule("R19c")]
    public WorkOfBreathing.FastAndLabouringOptions FastAndLabouring { get; init; } = new();

    /// <summary>Gets R19d's thresholds.</summary>
    [OfRule("R19d")]
    public WorkOfBreathing.LargeOwnBreathsOptions LargeOwnBreaths { get; init; } = new();

    /// <summary>Gets R20's thresholds.</summary>
    [OfRule("R20")]
    public Drive.RelaxantBegunOptions RelaxantBegun { get; init; } = new();

    /// <summary>Gets R21's thresholds.</summary>
    [OfRule("R21")]
    public CarbonDioxide.CarbonDioxideRisingOptions CarbonDioxideRising { get; init; } = new();

    /// <summary>Gets R22's thresholds.</summary>
    [OfRule("R22")]
    public CarbonDioxide.PHOptions PH { get; init; } = new();

    /// <summary>Gets R23's thresholds.</summary>
    [OfRule("R23")]
    public CarbonDioxide.PaCO2Options PaCO2 { get; init; } = new();

    /// <summary>Gets R24's thresholds.</summary>
    [OfRule("R24")]
    public Collapse.OxygenationWorseOptions OxygenationWorse { get; init; } = new();

    /// <summary>Gets R25's thresholds.</summary>
    [OfRule("R25")]
    public Oxygen.LowOxygenOptions LowOxygen { get; init; } = new();

    /// <summary>Gets R26's thresholds.</summary>
    [OfRule("R26")]
    public Oxygen.OxygenAboveTargetOptions OxygenAboveTarget { get; init; } = new();

    /// <summary>Gets R29's thresholds.</summary>
    [OfRule("R29")]
    public WorkOfBreathing.TubeCompensationOffOptions TubeCompensationOff { get; init; } = new();

    /// <summary>Gets R30's thresholds.</summary>
    [OfRule("R30")]
    public Drive.DeepSedationOptions DeepSedation { get; init; } = new();

    /// <summary>Gets R30b's thresholds.</summary>
    [OfRule("R30b")]
    public WorkOfBreathing.AgitatedOptions Agitated { get; init; } = new();

    /// <summary>Gets R31's thresholds.</summary>
    [OfRule("R31")]
    public Due.ChangeUnansweredOptions ChangeUnanswered { get; init; } = new();

    /// <summary>Gets R32's thresholds.</summary>
    [OfRule("R32")]
    public Due.CheckDueOptions CheckDue { get; init; } = new();

    /// <summary>Gets R33's thresholds.</summary>
    [OfRule("R33")]
    public Due.PlateauDueOptions PlateauDue { get; init; } = new();

    /// <summary>Gets R34's thresholds.</summary>
    [OfRule("R34")]
    public Collapse.MeanPressureFellOptions MeanPressureFell { get; init; } = new();

    /// <summary>Gets R35's thresholds.</summary>
    [OfRule("R35")]
    public StepDown.StepWithoutTimeOptions StepWithoutTime { get; init; } = new();

    /// <summary>Gets R36's thresholds.</summary>
    [OfRule("R36")]
    public StepDown.LargeStepOptions LargeStep { get; init; } = new();

    /// <summary>Gets R37's thresholds.</summary>
    [OfRule("R37")]
    public StepDown.CpapLevelOptions CpapLevel { get; init; } = new();

    /// <summary>Gets R38's thresholds.</summary>
    [OfRule("R38")]
    public Liberation.TrialScreenOptions TrialScreen { get; init; } = new();

    /// <summary>Gets R39's thresholds.</summary>
    [OfRule("R39")]
    public Liberation.TrialOutcomeOptions TrialOutcome { get; init; } = new();

    /// <summary>Gets R41's thresholds.</summary>
    [OfRule("R41")]
    public Volumes.TidalVolumeHighOptions TidalVolumeHigh { get; init; } = new();

    /// <summary>Gets R42's thresholds.</summary>
    [OfRule("R42")]
    public Volumes.PlateauHighOptions PlateauHigh { get; init; } = new();

    /// <summary>Gets R43's thresholds.</summary>
    [OfRule("R43")]
    public Volumes.DrivingPressureHighOptions DrivingPressureHigh { get; init; } = new();

    /// <summary>Gets R44's thresholds.</summary>
    [OfRule("R44")]
    public Volumes.TrappedPressureOptions TrappedPressure { get; init; } = new();

    /// <summary>Gets R45's thresholds.</summary>
    [OfRule("R45")]
    public WorkOfBreathing.SupportUnsettledOptions SupportUnsettled { get; init; } = new();

    /// <summary>Gets R47's thresholds.</summary>
    [OfRule("R47")]
    public Circulation.LowPressureOptions LowPressure { get; init; } = new();

    /// <summary>Gets R51's thresholds.</summary>
    [OfRule("R51")]
    public Due.BaselineDueOptions BaselineDue { get; init; } = new();

    /// <summary>Gets R53's thresholds.</summary>
    [OfRule("R53")]
    public Drive.MinuteVolumeFellOptions MinuteVolumeFell { get; init; } = new();

    /// <summary>Gets R54's thresholds.</summary>
    [OfRule("R54")]
    public Collapse.OxygenFellAfterPressureOptions OxygenFellAfterPressure { get; init; } = new();

    /// <summary>Gets R55's thresholds.</summary>
    [OfRule("R55")]
    public Oxygen.CreepingFiO2Options CreepingFiO2 { get; init; } = new();

    /// <summary>Gets R56's thresholds.</summary>
    [OfRule("R56")]
    public Sudden.SuddenChangeOptions SuddenChange { get; init; } = new();

    /// <summary>Gets R57's thresholds.</summary>
    [OfRule("R57")]
    public CarbonDioxide.VenousPHOptions VenousPH { get; init; } = new();

    /// <summary>Gets R59's thresholds.</summary>
    [OfRule("R59")]
    public Airway.TimeConstantRisingOptions TimeConstantRising { get; init; } = new();

    /// <summary>The defaults with what a unit chose instead, by <see cref="Threshold.Key"/>; a key that is not known is left out.</summary>
    public static RuleThresholds With(IReadOnlyDictionary<string, double> chosen)
    {
        ArgumentNullException.ThrowIfNull(chosen);
        var thresholds = new RuleThresholds();
        foreach (var threshold in Threshold.All.Where(t => chosen.ContainsKey(t.Key)))
        {
            threshold.Put(thresholds, chosen[threshold.Key]);
        }

        return thresholds;
    }
}
