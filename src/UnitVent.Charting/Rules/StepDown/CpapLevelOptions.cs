namespace UnitVent.Charting.Rules.StepDown;

/// <summary>The unit's criteria of a level near CPAP [common practice].</summary>
public sealed record CpapLevelOptions
{
    /// <summary>Gets the P high up to.</summary>
    [Threshold("P high up to", 10, 20, Unit = "cmH2O")]
    public double PHighUpToCmH2O { get; init; } = 15;

    /// <summary>Gets the T high from.</summary>
    [Threshold("T high from", 6, 20, Unit = "s")]
    public double THighFromS { get; init; } = 10;

    /// <summary>Gets the FiO2 up to.</summary>
    [Threshold("FiO2 up to", 0.3, 0.6)]
    public double FiO2UpTo { get; init; } = 0.4;

    /// <summary>Gets the own share of minute volume from.</summary>
    [Threshold("own share of minute volume from", 50, 100, Unit = "%")]
    public double OwnShareFromPercent { get; init; } = 80;

    /// <summary>Gets the for how long.</summary>
    [Threshold("for how long", 1, 24, Unit = "h")]
    public double ForHours { get; init; } = 4;
}
