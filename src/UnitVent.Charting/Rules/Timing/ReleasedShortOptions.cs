namespace UnitVent.Charting.Rules.Timing;

/// <summary>When a release counts as short [common practice]. The flow aimed at is that of R01.</summary>
public sealed record ReleasedShortOptions
{
    /// <summary>Gets how far above the target it is short under a fixed rate.</summary>
    [Threshold("how far above the target it is short under a fixed rate", 10, 40, Unit = "points")]
    public double FixedRateAbove { get; init; } = 25;

    /// <summary>Gets how far above the target it is short when the flow trace guides.</summary>
    [Threshold("how far above the target it is short when the flow trace guides", 5, 20, Unit = "points")]
    public double FlowGuidedAbove { get; init; } = 15;

    /// <summary>Gets the arterial pH under which that matters.</summary>
    [Threshold("arterial pH under which that matters", 7.20, 7.40)]
    public double PHUnder { get; init; } = 7.30;

    /// <summary>Gets the arterial pH under which it is a caution.</summary>
    [Threshold("arterial pH under which it is a caution", 7.15, 7.35)]
    public double CautionPHUnder { get; init; } = 7.25;

    /// <summary>Gets the release volume under which that matters.</summary>
    [Threshold("release volume under which that matters", 2, 5, Unit = "mL/kg")]
    public double VolumeUnderMlPerKg { get; init; } = 3;
}
