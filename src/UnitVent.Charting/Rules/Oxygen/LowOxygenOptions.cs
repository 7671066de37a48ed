namespace UnitVent.Charting.Rules.Oxygen;

/// <summary>When oxygen counts as low. Defaults: lower edges of the ARDS Network protocol, N Engl J Med 2000;342:1301.</summary>
public sealed record LowOxygenOptions
{
    /// <summary>Gets the SpO2 under which it is urgent.</summary>
    [Threshold("SpO2 under which it is urgent", 80, 94, Unit = "%", Source = "N Engl J Med 2000;342:1301-1308", Urgent = true)]
    public double SpO2LowPercent { get; init; } = 88;

    /// <summary>Gets the PaO2 under which it is urgent.</summary>
    [Threshold("PaO2 under which it is urgent", 45, 70, Unit = "mmHg", Source = "N Engl J Med 2000;342:1301-1308", Urgent = true)]
    public double PaO2LowMmHg { get; init; } = 55;

    /// <summary>Gets the SpO2 under which it is urgent whatever the target says.</summary>
    [Threshold("SpO2 under which it is urgent whatever the target says", 80, 88, Unit = "%", Urgent = true)]
    public double SpO2FloorPercent { get; init; } = 80;

    /// <summary>Gets the saturation under which it is urgent on ECMO.</summary>
    [Threshold("saturation under which it is urgent on ECMO", 75, 88, Unit = "%", Source = "from memory: ELSO 2021", Urgent = true)]
    public double OnEcmoSpO2Percent { get; init; } = 80;
}
