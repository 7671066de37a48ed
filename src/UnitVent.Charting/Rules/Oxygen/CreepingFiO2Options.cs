namespace UnitVent.Charting.Rules.Oxygen;

/// <summary>When the need for oxygen counts as creeping up [common practice].</summary>
public sealed record CreepingFiO2Options
{
    /// <summary>Gets the rise of FiO2.</summary>
    [Threshold("rise of FiO2", 0.1, 0.4)]
    public double FiO2Rise { get; init; } = 0.20;

    /// <summary>Gets the relative fall of S/F.</summary>
    [Threshold("relative fall of S/F", 0.1, 0.4)]
    public double SfFall { get; init; } = 0.20;

    /// <summary>Gets within how many hours.</summary>
    [Threshold("within how many hours", 4, 24, Unit = "h")]
    public double WithinHours { get; init; } = 8;
}
