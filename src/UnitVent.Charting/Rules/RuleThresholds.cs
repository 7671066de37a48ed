namespace UnitVent.Charting.Rules;

/// <summary>The unit's thresholds. Each has a default with its source; values without a printed source are common practice.</summary>
public sealed record RuleThresholds
{
    /// <summary>Gets R01's thresholds.</summary>
    [OfRule("R01")]
    public Timing.ReleasedLongOptions ReleasedLong { get; init; } = new();

    /// <summary>Gets R04's thresholds.</summary>
    [OfRule("R04")]
    public Volumes.ReleaseVolumeHighOptions ReleaseVolumeHigh { get; init; } = new();

    /// <summary>Gets R13's thresholds.</summary>
    [OfRule("R13")]
    public Slips.MeanPressuresDifferOptions MeanPressuresDiffer { get; init; } = new();

    /// <summary>Gets R16's thresholds.</summary>
    [OfRule("R16")]
    public Slips.OxygenDoesNotFitOptions OxygenDoesNotFit { get; init; } = new();

    /// <summary>Gets R18's thresholds.</summary>
    [OfRule("R18")]
    public Slips.VolumesDoNotAddUpOptions VolumesDoNotAddUp { get; init; } = new();

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

    /// <summary>Gets R32's thresholds.</summary>
    [OfRule("R32")]
    public Due.CheckDueOptions CheckDue { get; init; } = new();

    /// <summary>Gets R55's thresholds.</summary>
    [OfRule("R55")]
    public Oxygen.CreepingFiO2Options CreepingFiO2 { get; init; } = new();

    /// <summary>Gets R56's thresholds.</summary>
    [OfRule("R56")]
    public Sudden.SuddenChangeOptions SuddenChange { get; init; } = new();

    /// <summary>Gets R57's thresholds.</summary>
    [OfRule("R57")]
    public CarbonDioxide.VenousPHOptions VenousPH { get; init; } = new();

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
