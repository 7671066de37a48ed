namespace UnitVent.Charting.Rules.Drive;

/// <summary>When deep sedation with little own breathing counts [common practice].</summary>
public sealed record DeepSedationOptions
{
    /// <summary>Gets the RASS down from which sedation is deep.</summary>
    [Threshold("RASS down from which sedation is deep", -5, -2)]
    public double RassAtMost { get; init; } = -3;

    /// <summary>Gets the own share under which there is little own breathing.</summary>
    [Threshold("own share under which there is little own breathing", 2, 20, Unit = "%")]
    public double UnderPercent { get; init; } = 10;

    /// <summary>Gets how long both have to last.</summary>
    [Threshold("how long both have to last", 4, 24, Unit = "h")]
    public double ForHours { get; init; } = 8;
}
