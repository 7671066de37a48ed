namespace UnitVent.Charting.Rules.Circulation;

/// <summary>When blood pressure counts as low on a high mean airway pressure [common practice].</summary>
public sealed record LowPressureOptions
{
    /// <summary>Gets the mean airway pressure from which it counts.</summary>
    [Threshold("mean airway pressure from which it counts", 12, 30, Unit = "cmH2O", Urgent = true)]
    public double MeanAirwayFromCmH2O { get; init; } = 20;

    /// <summary>Gets the mean arterial pressure under which it is a caution.</summary>
    [Threshold("mean arterial pressure under which it is a caution", 55, 80, Unit = "mmHg")]
    public double UnderMmHg { get; init; } = 65;

    /// <summary>Gets the mean arterial pressure under which it is urgent.</summary>
    [Threshold("mean arterial pressure under which it is urgent", 50, 65, Unit = "mmHg", Urgent = true)]
    public double UrgentUnderMmHg { get; init; } = 60;
}
