namespace UnitVent.Charting.Rules.Liberation;

/// <summary>The unit's screen before a breathing trial [common practice; daily before noon: Respir Care 2024;69:891].</summary>
public sealed record TrialScreenOptions
{
    /// <summary>Gets the FiO2 up to.</summary>
    [Threshold("FiO2 up to", 0.3, 0.6)]
    public double FiO2UpTo { get; init; } = 0.4;

    /// <summary>Gets the PEEP up to.</summary>
    [Threshold("PEEP up to", 5, 10, Unit = "cmH2O")]
    public double PeepUpToCmH2O { get; init; } = 8;

    /// <summary>Gets the SpO2 from.</summary>
    [Threshold("SpO2 from", 85, 95, Unit = "%")]
    public double SpO2FromPercent { get; init; } = 90;

    /// <summary>Gets the P/F from.</summary>
    [Threshold("P/F from", 120, 250, Unit = "mmHg")]
    public double PfFromMmHg { get; init; } = 150;

    /// <summary>Gets the pH from.</summary>
    [Threshold("pH from", 7.2, 7.35)]
    public double PHFrom { get; init; } = 7.25;

    /// <summary>Gets the RASS from.</summary>
    [Threshold("RASS from", -3, 0)]
    public double RassFrom { get; init; } = -2;

    /// <summary>Gets the RASS to.</summary>
    [Threshold("RASS to", 0, 2)]
    public double RassTo { get; init; } = 1;

    /// <summary>Gets the hours since FiO2 was last raised.</summary>
    [Threshold("hours since FiO2 was last raised", 4, 48, Unit = "h")]
    public double FiO2NotRaisedForHours { get; init; } = 12;

    /// <summary>Gets the hours since a trial failed.</summary>
    [Threshold("hours since a trial failed", 12, 48, Unit = "h")]
    public double FailedTrialForHours { get; init; } = 24;
}
