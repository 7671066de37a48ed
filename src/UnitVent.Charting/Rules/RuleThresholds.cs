namespace UnitVent.Charting.Rules;

/// <summary>The unit's thresholds. Each has a default with its source; values without a printed source are common practice.</summary>
public sealed record RuleThresholds
{
    /// <summary>Gets R01's thresholds.</summary>
    public Timing.ReleasedLongOptions ReleasedLong { get; init; } = new();

    /// <summary>Gets R04's thresholds.</summary>
    public Volumes.ReleaseVolumeHighOptions ReleaseVolumeHigh { get; init; } = new();

    /// <summary>Gets R24's thresholds.</summary>
    public Collapse.OxygenationWorseOptions OxygenationWorse { get; init; } = new();

    /// <summary>Gets R25's thresholds.</summary>
    public Oxygen.LowOxygenOptions LowOxygen { get; init; } = new();

    /// <summary>Gets R32's thresholds.</summary>
    public Due.CheckDueOptions CheckDue { get; init; } = new();

    /// <summary>Gets R56's thresholds.</summary>
    public Sudden.SuddenChangeOptions SuddenChange { get; init; } = new();
}
