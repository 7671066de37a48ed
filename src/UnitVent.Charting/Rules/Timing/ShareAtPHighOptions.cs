namespace UnitVent.Charting.Rules.Timing;

/// <summary>When the share of the cycle at P high counts as low [common practice].</summary>
public sealed record ShareAtPHighOptions
{
    /// <summary>Gets the share under which it is an advisory.</summary>
    [Threshold("share under which it is an advisory", 70, 90, Unit = "%")]
    public double AdvisoryUnderPercent { get; init; } = 80;

    /// <summary>Gets the share under which it is a caution.</summary>
    [Threshold("share under which it is a caution", 50, 80, Unit = "%")]
    public double CautionUnderPercent { get; init; } = 70;
}
