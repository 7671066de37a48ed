namespace UnitVent.Charting.Rules.WorkOfBreathing;

/// <summary>When breathing counts as fast [common practice].</summary>
public sealed record FastAndLabouringOptions
{
    /// <summary>Gets the rate from which it is fast.</summary>
    [Threshold("rate from which it is fast", 25, 50, Unit = "/min")]
    public double RateFromPerMin { get; init; } = 35;
}
