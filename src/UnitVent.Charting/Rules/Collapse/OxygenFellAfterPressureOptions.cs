namespace UnitVent.Charting.Rules.Collapse;

/// <summary>When a fall of oxygen after mean airway pressure was lowered counts [common practice].</summary>
public sealed record OxygenFellAfterPressureOptions
{
    /// <summary>Gets by how much mean pressure was lowered.</summary>
    [Threshold("by how much mean pressure was lowered", 0.5, 3, Unit = "cmH2O")]
    public double PressureFallCmH2O { get; init; } = 0.5;

    /// <summary>Gets the relative fall of P/F.</summary>
    [Threshold("relative fall of P/F", 0.1, 0.4)]
    public double PfFall { get; init; } = 0.20;

    /// <summary>Gets the fall of SpO2.</summary>
    [Threshold("fall of SpO2", 2, 8, Unit = "points")]
    public double SpO2FallPoints { get; init; } = 4;

    /// <summary>Gets the time after the change within which it counts.</summary>
    [Threshold("time after the change within which it counts", 1, 12, Unit = "h")]
    public double WithinHours { get; init; } = 4;
}
