namespace UnitVent.Charting.Rules.Timing;

/// <summary>When a release counts as long: end-release flow in % of peak.</summary>
public sealed record ReleasedLongOptions
{
    /// <summary>Gets the flow aimed at under a fixed rate.</summary>
    [Threshold("flow aimed at under a fixed rate", 25, 75, Unit = "% of peak", Source = "Intensive Care Med 2017;43:1648-1659")]
    public double FixedRateTarget { get; init; } = 50;

    /// <summary>Gets the flow aimed at when the flow trace guides.</summary>
    [Threshold("flow aimed at when the flow trace guides", 50, 90, Unit = "% of peak", Source = "Eur Respir Rev 2019;28:180126")]
    public double FlowGuidedTarget { get; init; } = 75;

    /// <summary>Gets how far below the target is a caution under a fixed rate.</summary>
    [Threshold("how far below the target is a caution under a fixed rate", 2, 20, Unit = "points")]
    public double FixedRateCautionBelow { get; init; } = 5;

    /// <summary>Gets how far below the target is a caution when the flow trace guides.</summary>
    [Threshold("how far below the target is a caution when the flow trace guides", 5, 30, Unit = "points")]
    public double FlowGuidedCautionBelow { get; init; } = 15;

    /// <summary>Gets how far below the target is an advisory when the flow trace guides.</summary>
    [Threshold("how far below the target is an advisory when the flow trace guides", 2, 25, Unit = "points")]
    public double FlowGuidedAdvisoryBelow { get; init; } = 10;

    /// <summary>Gets the fall against the median of the hours before that is a caution under the target.</summary>
    [Threshold("fall against the median of the hours before that is a caution under the target", 5, 30, Unit = "points")]
    public double FallPoints { get; init; } = 10;

    /// <summary>Gets the flow under which it is urgent with a low P low.</summary>
    [Threshold("flow under which it is urgent with a low P low", 10, 40, Unit = "% of peak", Urgent = true)]
    public double UrgentUnder { get; init; } = 25;

    /// <summary>Gets the P low from which that is a caution only.</summary>
    [Threshold("P low from which that is a caution only", 3, 10, Unit = "cmH2O", Urgent = true)]
    public double PLowThatHoldsCmH2O { get; init; } = 5;

    /// <summary>Gets the caution edge in obstructive lungs.</summary>
    [Threshold("caution edge in obstructive lungs", 10, 50, Unit = "% of peak")]
    public double ObstructiveEdge { get; init; } = 25;

    /// <summary>Gets the urgent edge in obstructive lungs.</summary>
    [Threshold("urgent edge in obstructive lungs", 0, 25, Unit = "% of peak", Urgent = true)]
    public double ObstructiveUrgentUnder { get; init; } = 10;
}
