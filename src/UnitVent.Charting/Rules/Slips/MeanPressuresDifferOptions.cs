namespace UnitVent.Charting.Rules.Slips;

/// <summary>When measured and computed mean airway pressure differ too much [common practice].</summary>
public sealed record MeanPressuresDifferOptions
{
    /// <summary>Gets the difference for an advisory in cmH2O.</summary>
    [Threshold("difference for an advisory", 1, 5, Unit = "cmH2O")]
    public double AdvisoryCmH2O { get; init; } = 2;

    /// <summary>Gets the difference for an advisory as a share; both have to be passed.</summary>
    [Threshold("difference for an advisory as a share; both have to be passed", 0.05, 0.25)]
    public double AdvisoryShare { get; init; } = 0.10;

    /// <summary>Gets the difference for a caution as a share.</summary>
    [Threshold("difference for a caution as a share", 0.1, 0.5)]
    public double CautionShare { get; init; } = 0.20;
}
