namespace UnitVent.Charting.Rules.Timing;

/// <summary>When a release counts as long: end-release flow in % of peak.</summary>
public sealed record ReleasedLongOptions
{
    /// <summary>Gets the flow aimed at under a fixed rate. Intensive Care Med 2017;43:1648.</summary>
    public double FixedRateTarget { get; init; } = 50;

    /// <summary>Gets the flow aimed at when the flow trace guides. Eur Respir Rev 2019;28:180126.</summary>
    public double FlowGuidedTarget { get; init; } = 75;

    /// <summary>Gets how far below the target is a caution under a fixed rate [common practice].</summary>
    public double FixedRateCautionBelow { get; init; } = 5;

    /// <summary>Gets how far below the target is a caution when the flow trace guides [common practice].</summary>
    public double FlowGuidedCautionBelow { get; init; } = 15;

    /// <summary>Gets how far below the target is an advisory when the flow trace guides [common practice].</summary>
    public double FlowGuidedAdvisoryBelow { get; init; } = 10;

    /// <summary>Gets the flow under which it is urgent with a low P low [common practice].</summary>
    public double UrgentUnder { get; init; } = 25;

    /// <summary>Gets the P low from which the urgent level is a caution, cmH2O [common practice].</summary>
    public double PLowThatHoldsCmH2O { get; init; } = 5;

    /// <summary>Gets the caution edge in obstructive lungs [common practice].</summary>
    public double ObstructiveEdge { get; init; } = 25;

    /// <summary>Gets the urgent edge in obstructive lungs [common practice].</summary>
    public double ObstructiveUrgentUnder { get; init; } = 10;
}
