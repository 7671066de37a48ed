namespace UnitVent.Charting.Rules.WorkOfBreathing;

/// <summary>When a patient counts as agitated [common practice].</summary>
public sealed record AgitatedOptions
{
    /// <summary>Gets the RASS from which it counts.</summary>
    [Threshold("RASS from which it counts", 1, 4)]
    public double RassFrom { get; init; } = 2;
}
