namespace UnitVent.Charting.Rules.WorkOfBreathing;

/// <summary>When the patient's own share counts as high on high pressure [common practice].</summary>
public sealed record OwnShareHighOptions
{
    /// <summary>Gets the own share above which it counts.</summary>
    [Threshold("own share above which it counts", 40, 90, Unit = "%")]
    public double AbovePercent { get; init; } = 60;

    /// <summary>Gets the own rate above which it counts.</summary>
    [Threshold("own rate above which it counts", 20, 45, Unit = "/min")]
    public double RateAbovePerMin { get; init; } = 30;

    /// <summary>Gets the P high from which it counts.</summary>
    [Threshold("P high from which it counts", 15, 30, Unit = "cmH2O")]
    public double PHighFromCmH2O { get; init; } = 20;
}
