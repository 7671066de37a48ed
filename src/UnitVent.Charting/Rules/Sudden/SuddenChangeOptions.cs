namespace UnitVent.Charting.Rules.Sudden;

/// <summary>When a change within one check counts as sudden [common practice].</summary>
public sealed record SuddenChangeOptions
{
    /// <summary>Gets the fall of SpO2, points.</summary>
    public double SpO2FallPoints { get; init; } = 5;

    /// <summary>Gets the fall of mean arterial pressure that goes with it, mmHg.</summary>
    public double ArterialPressureFallMmHg { get; init; } = 15;

    /// <summary>Gets the relative fall of release or tidal volume that goes with it.</summary>
    public double VolumeFall { get; init; } = 0.25;
}
