namespace UnitVent.Charting.Rules.WorkOfBreathing;

/// <summary>When own breaths count as large [common practice].</summary>
public sealed record LargeOwnBreathsOptions
{
    /// <summary>Gets the volume above which they are large.</summary>
    [Threshold("own breath above which it is large", 6, 12, Unit = "mL/kg")]
    public double AboveMlPerKg { get; init; } = 8;
}
