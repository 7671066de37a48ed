namespace UnitVent.Charting.Rules.Airway;

/// <summary>When the expiratory time constant counts as rising [common practice].</summary>
public sealed record TimeConstantRisingOptions
{
    /// <summary>Gets the relative rise over a series of checks.</summary>
    [Threshold("relative rise over a series of checks", 0.15, 0.6)]
    public double Rise { get; init; } = 0.35;

    /// <summary>Gets the end-release flow under which a check does not count.</summary>
    [Threshold("end-release flow under which a check does not count", 2, 20, Unit = "% of peak")]
    public double EndFlowFromPercent { get; init; } = 5;

    /// <summary>Gets the end-release flow above which a check does not count.</summary>
    [Threshold("end-release flow above which a check does not count", 70, 95, Unit = "% of peak")]
    public double EndFlowToPercent { get; init; } = 90;
}
