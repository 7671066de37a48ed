namespace UnitVent.Physiology;

/// <summary>The relation of pH, carbon dioxide tension and bicarbonate, and whether a typed gas obeys it.</summary>
/// <remarks>Source of the constants: CLSI C46 (formerly NCCLS). The textbook pair, 0.03 and 6.1, moves pH by 0.005.</remarks>
public static class HendersonHasselbalch
{
    private const double SolubilityMmolPerLitrePerMmHg = 0.0307;
    private const double PK = 6.105;

    /// <summary>Computes the actual bicarbonate in mmol/L: 0.0307 × PCO2 [mmHg] × 10^(pH − 6.105).</summary>
    /// <returns>The unrounded concentration; not limited to what a <see cref="Physiology.Bicarbonate"/> holds.</returns>
    /// <exception cref="ArgumentOutOfRangeException">An argument is its default, 0.</exception>
    public static double Bicarbonate(BloodPH pH, PartialPressure pCO2)
    {
        ArgumentOutOfRangeException.ThrowIfEqual(pH, default);

        return DissolvedMmolPerLitre(pCO2) * Math.Pow(10, pH.Value - PK);
    }

    /// <summary>Computes pH: 6.105 + log10[HCO3 / (0.0307 × PCO2)].</summary>
    /// <exception cref="ArgumentOutOfRangeException">An argument is its default, 0.</exception>
    public static double PH(Bicarbonate bicarbonate, PartialPressure pCO2)
        => PK + Math.Log10(Guard.Positive(bicarbonate.MmolPerLitre, nameof(bicarbonate)) / DissolvedMmolPerLitre(pCO2));

    /// <summary>Computes the pH that follows from tension and bicarbonate, minus the pH typed; near 0 when the three fit together.</summary>
    /// <exception cref="ArgumentOutOfRangeException">An argument is its default, 0.</exception>
    public static double ConsistencyDeltaPH(BloodPH typed, PartialPressure pCO2, Bicarbonate bicarbonate)
    {
        ArgumentOutOfRangeException.ThrowIfEqual(typed, default);

        return PH(bicarbonate, pCO2) - typed.Value;
    }

    private static double DissolvedMmolPerLitre(PartialPressure pCO2)
        => SolubilityMmolPerLitrePerMmHg * Guard.Positive(pCO2.MmHg, nameof(pCO2));
}
