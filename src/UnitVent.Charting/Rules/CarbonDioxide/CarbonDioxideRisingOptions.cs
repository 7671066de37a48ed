namespace UnitVent.Charting.Rules.CarbonDioxide;

/// <summary>When carbon dioxide counts as rising against the gases of the hours before [common practice].</summary>
public sealed record CarbonDioxideRisingOptions
{
    /// <summary>Gets the rise of PaCO2.</summary>
    [Threshold("rise of PaCO2 against the median of the last 12 h", 5, 25, Unit = "mmHg")]
    public double PaCO2RiseMmHg { get; init; } = 10;

    /// <summary>Gets the fall of pH.</summary>
    [Threshold("fall of pH against the median of the last 12 h", 0.05, 0.2)]
    public double PHFall { get; init; } = 0.08;

    /// <summary>Gets the fall of base excess from which a metabolic part is named.</summary>
    [Threshold("fall of base excess from which a metabolic part is named", 2, 8, Unit = "mmol/L")]
    public double BaseExcessFallMmolL { get; init; } = 3;

    /// <summary>Gets the relative fall from which a part of ventilation is named.</summary>
    [Threshold("relative fall from which a part of ventilation is named", 0.05, 0.5)]
    public double PartFall { get; init; } = 0.15;
}
