namespace UnitVent.Physiology;

/// <summary>Base excess of blood and of the extracellular fluid, in mmol/L.</summary>
/// <remarks>Source, unless a form names another: CLSI C46 (formerly NCCLS). Valid within ±30 mmol/L. With its reference of 24.8 mmol/L, pH 7.40 and PCO2 40
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

    /// <summary>Computes BE = (1 − 0.0143 Hb) × [0.0304 PCO2 × 10^(pH − 6.1) − 24.26 + (9.5 + 1.63 Hb)(pH − 7.4)] − 0.2 Hb (1 − sO2).</summary>
    /// <remarks>Source: Lang W, Zander R. Clin Chem Lab Med 2002;40:404-410, where it was the most accurate of seven forms. It is 0 at
    /// pH 7.40, PCO2 40 mmHg and full saturation. To be held against an analyser that reports this form; never mixed with
    /// <see cref="Blood"/> in one trend.</remarks>
    /// <param name="pH">pH at 37 °C.</param>
    /// <param name="pCO2">Carbon dioxide tension at 37 °C.</param>
    /// <param name="haemoglobin">Haemoglobin concentration.</param>
    /// <param name="sO2">Oxygen saturation of the same sample.</param>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="pH"/> or <paramref name="pCO2"/> is its default.</exception>
    public static double Zander(BloodPH pH, PartialPressure pCO2, HaemoglobinConcentration haemoglobin, Saturation sO2)
    {
        ArgumentOutOfRangeException.ThrowIfEqual(pH, default);
        ArgumentOutOfRangeException.ThrowIfEqual(pCO2, default);

        var hb = haemoglobin.GramsPerDecilitre;
        var bicarbonate = 0.0304 * pCO2.MmHg * Math.Pow(10, pH.Value - 6.1);
        var buffered = bicarbonate - 24.26 + ((9.5 + (1.63 * hb)) * (pH.Value - 7.4));
        return ((1 - (0.0143 * hb)) * buffered) - (0.2 * hb * (1 - sO2.Fraction));
    }

    /// <summary>Computes the Van Slyke form of SBE: 0.9287 × [HCO3 − 24.4 + 14.83 (pH − 7.4)].</summary>
    /// <remarks>Source: Siggaard-Andersen O. Scand J Clin Lab Invest Suppl 1977;146:15-20, from memory. For an analyser that reports this
    /// form, as for <see cref="Zander"/>.</remarks>
    /// <param name="pH">pH at 37 °C.</param>
    /// <param name="bicarbonateMmolL">Actual bicarbonate in mmol/L, in [0, 1000].</param>
    /// <exception cref="ArgumentOutOfRangeException">As for <see cref="Blood"/>.</exception>
    public static double StandardVanSlyke(BloodPH pH, double bicarbonateMmolL)
        => 0.9287 * (WithBuffer(pH, bicarbonateMmolL, 14.83) + ReferenceMmolPerLitre - 24.4);

    private static double WithBuffer(BloodPH pH, double bicarbonateMmolL, double bufferMmolPerLitrePerPH)
    {
        ArgumentOutOfRangeException.ThrowIfEqual(pH, default);
        Guard.InRange(bicarbonateMmolL, 0, HighestBicarbonate);

        return bicarbonateMmolL - ReferenceMmolPerLitre + (bufferMmolPerLitrePerPH * (pH.Value - ReferencePH));
    }
}
