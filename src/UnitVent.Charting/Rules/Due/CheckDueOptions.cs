namespace UnitVent.Charting.Rules.Due;

/// <summary>When a ventilator check counts as overdue, in check intervals of the unit [common practice].</summary>
public sealed record CheckDueOptions
{
    /// <summary>Gets the age from which it is an advisory: 5 h at a 4 h interval.</summary>
    public double AdvisoryIntervals { get; init; } = 1.25;

    /// <summary>Gets the age from which it is a caution: 8 h at a 4 h interval.</summary>
    public double CautionIntervals { get; init; } = 2;
}
