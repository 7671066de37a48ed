namespace UnitVent.Charting.Rules.Volumes;

/// <summary>When a release volume counts as high [common practice].</summary>
public sealed record ReleaseVolumeHighOptions
{
    /// <summary>Gets the volume above which it is an advisory, mL/kg.</summary>
    public double AdvisoryMlPerKg { get; init; } = 8;

    /// <summary>Gets the volume above which it is a caution, mL/kg.</summary>
    public double CautionMlPerKg { get; init; } = 10;

    /// <summary>Gets the volume above which it is urgent, mL/kg.</summary>
    public double UrgentMlPerKg { get; init; } = 12;

    /// <summary>Gets the alveolar swing above which it is a caution, cmH2O.</summary>
    public double CautionSwingCmH2O { get; init; } = 15;
}
