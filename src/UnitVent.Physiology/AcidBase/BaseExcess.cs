namespace UnitVent.Physiology;

/// <summary>Base excess of blood and of the extracellular fluid, in mmol/L.</summary>
/// <remarks>Source: CLSI C46 (formerly NCCLS). Valid within ±30 mmol/L. With its reference of 24.8 mmol/L, pH 7.40 and PCO2 40
/// give about −0.5, not 0; analysers with other constants differ by up to 2 mmol/L
/// (Lang W, Zander R. Clin Chem Lab Med 2002;40:404-410).</remarks>
public static class BaseExcess
{
    private const double ReferenceMmolPerLitre = 24.8;
    private const double ReferencePH = 7.40;
    private const double HighestBicarbonate = 1000; // no blood; lets a slip of entry be shown instead of thrown

    /// <summary>Computes BE(B) = (1 − 0.014 Hb) × [HCO3 − 24.8 + (1.43 Hb + 7.7)(pH − 7.40)], Hb in g/dL.</summary>
    /// <param name="pH">pH at 37 °C.</param>
    /// <param name="bicarbonateMmolL">Actual bicarbonate in mmol/L, in [0, 1000].</param>
    /// <param name="haemoglobin">Haemoglobin concentration.</param>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="pH"/> is its default, or
    /// <paramref name="bicarbonateMmolL"/> is NaN or outside [0, 1000].</exception>
    public static double Blood(BloodPH pH, double bicarbonateMmolL, HaemoglobinConcentration haemoglobin)
    {
        var hb = haemoglobin.GramsPerDecilitre;
        return (1 - (0.014 * hb)) * WithBuffer(pH, bicarbonateMmolL, (1.43 * hb) + 7.7);
    }

    /// <summary>Computes SBE = HCO3 − 24.8 + 16.2 (pH − 7.40), which needs no haemoglobin.</summary>
    /// <param name="pH">pH at 37 °C.</param>
    /// <param name="bicarbonateMmolL">Actual bicarbonate in mmol/L, in [0, 1000].</param>
    /// <exception cref="ArgumentOutOfRangeException">As for <see cref="Blood"/>.</exception>
    public static double Standard(BloodPH pH, double bicarbonateMmolL) => WithBuffer(pH, bicarbonateMmolL, 16.2);

    private static double WithBuffer(BloodPH pH, double bicarbonateMmolL, double bufferMmolPerLitrePerPH)
    {
        ArgumentOutOfRangeException.ThrowIfEqual(pH, default);
        Guard.InRange(bicarbonateMmolL, 0, HighestBicarbonate);

        return bicarbonateMmolL - ReferenceMmolPerLitre + (bufferMmolPerLitrePerPH * (pH.Value - ReferencePH));
    }
}
