namespace UnitVent.Charting.Rules.Oxygen;

/// <summary>When oxygen counts as more than is aimed at [common practice].</summary>
public sealed record OxygenAboveTargetOptions
{
    /// <summary>Gets the SpO2 above which it is more than aimed at.</summary>
    [Threshold("SpO2 above which it is more than aimed at", 94, 100, Unit = "%")]
    public double SpO2AbovePercent { get; init; } = 96;

    /// <summary>Gets the PaO2 above which it is more than aimed at.</summary>
    [Threshold("PaO2 above which it is more than aimed at", 80, 150, Unit = "mmHg")]
    public double PaO2AboveMmHg { get; init; } = 100;

    /// <summary>Gets the FiO2 above which that counts.</summary>
    [Threshold("FiO2 above which that counts", 0.3, 0.6)]
    public double AtFiO2Above { get; init; } = 0.40;

    /// <summary>Gets how long it has to last.</summary>
    [Threshold("how long it has to last, in two readings", 1, 12, Unit = "h")]
    public double OverHours { get; init; } = 2;

    /// <summary>Gets the PaO2 above which one gas is enough.</summary>
    [Threshold("PaO2 above which one gas is enough", 120, 250, Unit = "mmHg")]
    public double AtOnceMmHg { get; init; } = 150;
}
