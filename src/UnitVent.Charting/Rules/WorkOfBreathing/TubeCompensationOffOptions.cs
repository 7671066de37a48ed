namespace UnitVent.Charting.Rules.WorkOfBreathing;

/// <summary>When a patient counts as breathing through the tube [common practice].</summary>
public sealed record TubeCompensationOffOptions
{
    /// <summary>Gets the own share from which the patient breathes.</summary>
    [Threshold("own share from which the patient breathes", 5, 100, Unit = "%")]
    public double ShareFromPercent { get; init; } = 10;

    /// <summary>Gets the own rate from which the patient breathes.</summary>
    [Threshold("own rate from which the patient breathes", 4, 60, Unit = "/min")]
    public double RateFromPerMin { get; init; } = 8;
}
