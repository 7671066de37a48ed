namespace UnitVent.Charting.Rules.Due;

/// <summary>By when the first charting is due [common practice].</summary>
public sealed record BaselineDueOptions
{
    /// <summary>Gets the hours after admission by which the baseline is due.</summary>
    [Threshold("hours after admission by which the baseline is due", 1, 12, Unit = "h")]
    public double Hours { get; init; } = 4;
}
