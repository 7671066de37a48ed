namespace UnitVent.Charting.Rules.Timing;

/// <summary>When P low is high beside what the end of the release already holds [common practice].</summary>
public sealed record PressureLowHoldsOptions
{
    /// <summary>Gets the P low above which it counts.</summary>
    [Threshold("P low above which it counts", 5, 12, Unit = "cmH2O")]
    public double PLowAboveCmH2O { get; init; } = 5;

    /// <summary>Gets the end-release flow above which it counts.</summary>
    [Threshold("end-release flow above which it counts", 25, 75, Unit = "% of peak")]
    public double EndFlowAbovePercent { get; init; } = 50;
}
