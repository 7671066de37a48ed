namespace UnitVent.Charting.Rules.Volumes;

/// <summary>When measured auto-PEEP counts as high [common practice].</summary>
public sealed record TrappedPressureOptions
{
    /// <summary>Gets the auto-PEEP above which it is an advisory.</summary>
    [Threshold("auto-PEEP above which it is an advisory", 3, 8, Unit = "cmH2O")]
    public double AdvisoryCmH2O { get; init; } = 5;

    /// <summary>Gets the auto-PEEP above which it is a caution.</summary>
    [Threshold("auto-PEEP above which it is a caution", 6, 15, Unit = "cmH2O")]
    public double CautionCmH2O { get; init; } = 10;
}
