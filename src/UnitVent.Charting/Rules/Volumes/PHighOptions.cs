namespace UnitVent.Charting.Rules.Volumes;

/// <summary>When P high counts as high [common practice].</summary>
public sealed record PHighOptions
{
    /// <summary>Gets the P high above which it is an advisory.</summary>
    [Threshold("P high above which it is an advisory", 20, 40, Unit = "cmH2O")]
    public double AdvisoryCmH2O { get; init; } = 30;

    /// <summary>Gets the P high above which it is a caution.</summary>
    [Threshold("P high above which it is a caution", 25, 45, Unit = "cmH2O")]
    public double CautionCmH2O { get; init; } = 35;

    /// <summary>Gets the allowance for a stiff chest wall.</summary>
    [Threshold("allowance for a stiff chest wall", 0, 10, Unit = "cmH2O")]
    public double StiffChestWallCmH2O { get; init; } = 5;
}
