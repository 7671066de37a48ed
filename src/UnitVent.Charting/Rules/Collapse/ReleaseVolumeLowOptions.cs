namespace UnitVent.Charting.Rules.Collapse;

/// <summary>When a release volume counts as low [common practice].</summary>
public sealed record ReleaseVolumeLowOptions
{
    /// <summary>Gets the release volume under which it is low.</summary>
    [Threshold("release volume under which it is low", 2, 6, Unit = "mL/kg")]
    public double UnderMlPerKg { get; init; } = 4;

    /// <summary>Gets the arterial pH under which that matters.</summary>
    [Threshold("arterial pH under which that matters", 7.15, 7.40)]
    public double PHUnder { get; init; } = 7.30;

    /// <summary>Gets the fall in a series of checks at the same settings.</summary>
    [Threshold("fall in a series of checks at the same settings", 0.5, 3, Unit = "mL/kg")]
    public double FallMlPerKg { get; init; } = 1;
}
