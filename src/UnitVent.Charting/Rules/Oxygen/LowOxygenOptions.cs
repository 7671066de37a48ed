namespace UnitVent.Charting.Rules.Oxygen;

/// <summary>When oxygen counts as low. Defaults: lower edges of the ARDS Network protocol, N Engl J Med 2000;342:1301.</summary>
public sealed record LowOxygenOptions
{
    /// <summary>Gets the SpO2 under which it is urgent, %.</summary>
    public double SpO2LowPercent { get; init; } = 88;

    /// <summary>Gets the PaO2 under which it is urgent, mmHg.</summary>
    public double PaO2LowMmHg { get; init; } = 55;

    /// <summary>Gets the SpO2 under which it is urgent whatever the target says, %. No unit goes below it.</summary>
    public double SpO2FloorPercent { get; init; } = 80;

    /// <summary>Gets the saturation under which it is urgent on ECMO, % [from memory: ELSO 2021].</summary>
    public double OnEcmoSpO2Percent { get; init; } = 80;
}
