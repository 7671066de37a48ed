namespace UnitVent.Charting.Rules.Due;

/// <summary>How often a plateau pressure is due in controlled modes [common practice].</summary>
public sealed record PlateauDueOptions
{
    /// <summary>Gets the hours since the last plateau.</summary>
    [Threshold("hours since the last plateau", 4, 24, Unit = "h")]
    public double Hours { get; init; } = 12;
}
