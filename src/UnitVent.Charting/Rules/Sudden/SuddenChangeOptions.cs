namespace UnitVent.Charting.Rules.Sudden;

/// <summary>When a change within one check counts as sudden [common practice].</summary>
public sealed record SuddenChangeOptions
{
    /// <summary>Gets the fall of SpO2 from one check to the next.</summary>
    [Threshold("fall of SpO2 from one check to the next", 4, 10, Unit = "points", Urgent = true)]
    public double SpO2FallPoints { get; init; } = 5;

    /// <summary>Gets the fall of mean arterial pressure that goes with it.</summary>
    [Threshold("fall of mean arterial pressure that goes with it", 10, 30, Unit = "mmHg", Urgent = true)]
    public double ArterialPressureFallMmHg { get; init; } = 15;

    /// <summary>Gets the relative fall of release or tidal volume that goes with it.</summary>
    [Threshold("relative fall of release or tidal volume that goes with it", 0.15, 0.5, Urgent = true)]
    public double VolumeFall { get; init; } = 0.25;
}
