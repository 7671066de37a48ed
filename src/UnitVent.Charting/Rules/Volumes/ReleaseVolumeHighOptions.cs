namespace UnitVent.Charting.Rules.Volumes;

/// <summary>When a release volume counts as high [common practice].</summary>
public sealed record ReleaseVolumeHighOptions
{
    /// <summary>Gets the release volume above which it is an advisory.</summary>
    [Threshold("release volume above which it is an advisory", 6, 10, Unit = "mL/kg")]
    public double AdvisoryMlPerKg { get; init; } = 8;

    /// <summary>Gets the release volume above which it is a caution.</summary>
    [Threshold("release volume above which it is a caution", 8, 12, Unit = "mL/kg")]
    public double CautionMlPerKg { get; init; } = 10;

    /// <summary>Gets the release volume above which it is urgent.</summary>
    [Threshold("release volume above which it is urgent", 10, 15, Unit = "mL/kg", Urgent = true)]
    public double UrgentMlPerKg { get; init; } = 12;

    /// <summary>Gets the alveolar swing above which it is a caution.</summary>
    [Threshold("alveolar swing above which it is a caution", 10, 25, Unit = "cmH2O")]
    public double CautionSwingCmH2O { get; init; } = 15;
}
