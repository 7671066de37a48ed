namespace UnitVent.Charting.Rules.Timing;

/// <summary>Where T low usually lies [common practice].</summary>
public sealed record TimeLowOptions
{
    /// <summary>Gets the lower edge.</summary>
    [Threshold("lower edge of T low", 0.1, 0.5, Unit = "s")]
    public double FromS { get; init; } = 0.3;

    /// <summary>Gets the upper edge.</summary>
    [Threshold("upper edge of T low", 0.6, 1.2, Unit = "s")]
    public double ToS { get; init; } = 0.8;

    /// <summary>Gets the time above which it is a caution, and the upper edge in obstructive lungs.</summary>
    [Threshold("T low above which it is a caution, and the upper edge in obstructive lungs", 1, 3, Unit = "s")]
    public double CautionAboveS { get; init; } = 1.5;
}
