namespace UnitVent.Charting.Rules.CarbonDioxide;

/// <summary>Between which edges arterial carbon dioxide tension lies [common practice].</summary>
public sealed record PaCO2Options
{
    /// <summary>Gets the lower edge of the band.</summary>
    [Threshold("lower edge of the band", 25, 45, Unit = "mmHg")]
    public double LowMmHg { get; init; } = 35;

    /// <summary>Gets the upper edge of the band.</summary>
    [Threshold("upper edge of the band", 40, 80, Unit = "mmHg")]
    public double HighMmHg { get; init; } = 60;

    /// <summary>Gets the PaCO2 under which it is urgent.</summary>
    [Threshold("PaCO2 under which it is urgent", 15, 30, Unit = "mmHg", Urgent = true)]
    public double UrgentUnderMmHg { get; init; } = 25;

    /// <summary>Gets the PaCO2 over which it is urgent.</summary>
    [Threshold("PaCO2 over which it is urgent", 65, 110, Unit = "mmHg", Urgent = true)]
    public double UrgentOverMmHg { get; init; } = 80;

    /// <summary>Gets the usual PaCO2 of a chronic retainer without a band of their own.</summary>
    [Threshold("usual PaCO2 of a chronic retainer without a band of their own", 45, 75, Unit = "mmHg")]
    public double RetainerUsualMmHg { get; init; } = 55;

    /// <summary>Gets how far a chronic retainer may be from it.</summary>
    [Threshold("how far a chronic retainer may be from it", 4, 15, Unit = "mmHg")]
    public double RetainerWithinMmHg { get; init; } = 8;

    /// <summary>Gets the lower edge with raised intracranial pressure.</summary>
    [Threshold("raised intracranial pressure: lower edge, caution", 30, 38, Unit = "mmHg")]
    public double RaisedIcpLowMmHg { get; init; } = 35;

    /// <summary>Gets the upper edge with raised intracranial pressure.</summary>
    [Threshold("raised intracranial pressure: upper edge, caution", 40, 50, Unit = "mmHg")]
    public double RaisedIcpHighMmHg { get; init; } = 45;

    /// <summary>Gets the PaCO2 under which it is urgent with raised intracranial pressure.</summary>
    [Threshold("raised intracranial pressure: urgent under", 25, 33, Unit = "mmHg", Urgent = true)]
    public double RaisedIcpUrgentUnderMmHg { get; init; } = 30;

    /// <summary>Gets the PaCO2 over which it is urgent with raised intracranial pressure.</summary>
    [Threshold("raised intracranial pressure: urgent over", 45, 60, Unit = "mmHg", Urgent = true)]
    public double RaisedIcpUrgentOverMmHg { get; init; } = 50;
}
