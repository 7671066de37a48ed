namespace UnitVent.Simulation.Lung;

/// <summary>PaCO2 on its way to where production and alveolar ventilation balance.</summary>
/// <remarks>
/// The body's stores make it rise slowly and fall faster: half-times of 16 and 3 min [from memory: Nunn's Applied Respiratory Physiology].
/// Exact for ventilation that is constant over a step.
/// </remarks>
public sealed class CarbonDioxideStore(double paCO2MmHg)
{
    private const double HalfTimeRisingMin = 16;
    private const double HalfTimeFallingMin = 3;
    private const double Highest = 200; // no ventilation at all would rise without end

    public double PaCO2MmHg { get; private set; } = paCO2MmHg;

    /// <summary>PaCO2 = 0.863 × VCO2 / VA, VCO2 in mL/min at standard, VA in L/min at body conditions. Identity of respiratory physiology.</summary>
    public static double BalanceMmHg(double outputMlMin, double alveolarLMin) =>
        Math.Min(Highest, 0.863 * outputMlMin / Math.Max(alveolarLMin, 1e-3));

    public void Advance(double minutes, double balanceMmHg)
    {
        var halfTime = balanceMmHg > PaCO2MmHg ? HalfTimeRisingMin : HalfTimeFallingMin;
        PaCO2MmHg = balanceMmHg + ((PaCO2MmHg - balanceMmHg) * double.Exp2(-minutes / halfTime));
    }
}
