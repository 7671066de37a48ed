namespace UnitVent.Charting.Rules.Liberation;

/// <summary>When the outcome of a breathing trial counts as missing [common practice].</summary>
public sealed record TrialOutcomeOptions
{
    /// <summary>Gets the hours since the trial began.</summary>
    [Threshold("hours since the trial began", 1, 4, Unit = "h")]
    public double Hours { get; init; } = 2.5;
}
