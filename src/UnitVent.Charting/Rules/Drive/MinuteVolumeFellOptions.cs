namespace UnitVent.Charting.Rules.Drive;

/// <summary>When a fall of total minute volume counts [common practice].</summary>
public sealed record MinuteVolumeFellOptions
{
    /// <summary>Gets the relative fall against the highest of the checks before.</summary>
    [Threshold("relative fall against the highest of the checks before", 0.15, 0.6)]
    public double Fall { get; init; } = 0.30;

    /// <summary>Gets how far back the checks before reach.</summary>
    [Threshold("how far back the checks before reach", 4, 24, Unit = "h")]
    public double WithinHours { get; init; } = 9;
}
