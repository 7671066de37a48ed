namespace UnitVent.Charting.Rules.Due;

/// <summary>When a ventilator check counts as overdue, in check intervals of the unit [common practice].</summary>
public sealed record CheckDueOptions
{
    /// <summary>Gets the age of the last check for an advisory, in check intervals.</summary>
    [Threshold("age of the last check for an advisory, in check intervals", 1, 2, Unit = "×")]
    public double AdvisoryIntervals { get; init; } = 1.25;

    /// <summary>Gets the age of the last check for a caution, in check intervals.</summary>
    [Threshold("age of the last check for a caution, in check intervals", 1.5, 4, Unit = "×")]
    public double CautionIntervals { get; init; } = 2;
}
