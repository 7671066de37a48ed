namespace UnitVent.Charting.Rules.Collapse;

/// <summary>When a fall of mean airway pressure counts [common practice].</summary>
public sealed record MeanPressureFellOptions
{
    /// <summary>Gets the fall by the settings.</summary>
    [Threshold("fall by the settings", 1, 6, Unit = "cmH2O")]
    public double FallCmH2O { get; init; } = 2;

    /// <summary>Gets how long it is said.</summary>
    [Threshold("how long it is said", 1, 12, Unit = "h")]
    public double ForHours { get; init; } = 4;
}
