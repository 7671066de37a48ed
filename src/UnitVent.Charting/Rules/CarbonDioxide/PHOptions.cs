namespace UnitVent.Charting.Rules.CarbonDioxide;

/// <summary>When arterial pH counts as low or high. The ladder of the low side: ARDS Network protocol, N Engl J Med 2000;342:1301.</summary>
public sealed record PHOptions
{
    /// <summary>Gets the pH under which it is a caution.</summary>
    [Threshold("pH under which it is a caution", 7.20, 7.35)]
    public double CautionUnder { get; init; } = 7.25;

    /// <summary>Gets the pH under which it is urgent.</summary>
    [Threshold("pH under which it is urgent", 7.15, 7.30, Urgent = true)]
    public double UrgentUnder { get; init; } = 7.20;

    /// <summary>Gets the pH over which it is a caution.</summary>
    [Threshold("pH over which it is a caution", 7.45, 7.60)]
    public double CautionOver { get; init; } = 7.50;

    /// <summary>Gets the pH over which it is urgent.</summary>
    [Threshold("pH over which it is urgent", 7.50, 7.70, Urgent = true)]
    public double UrgentOver { get; init; } = 7.55;

    /// <summary>Gets the floor where a higher PaCO2 is accepted and the patient has no floor of their own.</summary>
    [Threshold("floor where a higher PaCO2 is accepted", 7.15, 7.30)]
    public double PermissiveFloor { get; init; } = 7.20;

    /// <summary>Gets the pH under which it is urgent whatever is accepted.</summary>
    [Threshold("pH under which it is urgent whatever is accepted", 7.15, 7.25, Source = "N Engl J Med 2000;342:1301-1308", Urgent = true)]
    public double UrgentUnderAlways { get; init; } = 7.15;

    /// <summary>Gets the base excess down to which a low pH is accepted.</summary>
    [Threshold("base excess down to which a low pH is accepted", -10, 0, Unit = "mmol/L", Urgent = true)]
    public double AcceptedBaseExcessMmolL { get; init; } = -4;
}
