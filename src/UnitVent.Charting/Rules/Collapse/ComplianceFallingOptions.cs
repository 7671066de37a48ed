namespace UnitVent.Charting.Rules.Collapse;

/// <summary>When effective compliance counts as falling [common practice].</summary>
public sealed record ComplianceFallingOptions
{
    /// <summary>Gets the relative fall over a series of checks.</summary>
    [Threshold("relative fall over a series of checks", 0.1, 0.4)]
    public double Fall { get; init; } = 0.20;

    /// <summary>Gets the end-release flow under which a check does not count.</summary>
    [Threshold("end-release flow under which a check does not count", 2, 20, Unit = "% of peak")]
    public double EndFlowFromPercent { get; init; } = 5;

    /// <summary>Gets the end-release flow above which a check does not count.</summary>
    [Threshold("end-release flow above which a check does not count", 50, 90, Unit = "% of peak")]
    public double EndFlowToPercent { get; init; } = 80;
}
