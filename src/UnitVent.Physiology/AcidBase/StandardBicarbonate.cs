namespace UnitVent.Physiology;

/// <summary>The bicarbonate the blood would have at PCO2 40 mmHg, fully oxygenated, at 37 °C.</summary>
public static class StandardBicarbonate
{
    private const double MmolPerLitrePerGramPerDecilitre = 0.6206; // haemoglobin monomer
    private const double HighestBaseExcess = 1000; // no blood; lets a slip of entry be shown instead of thrown

    /// <summary>Computes the standard bicarbonate in mmol/L from the base excess of blood.</summary>
    /// <remarks><para>24.47 + 0.919 Z + Z (Z − 8)(4.04·10⁻³ + 4.25·10⁻⁴ ctHb), with Z = BE(B) − 0.3062 ctHb (1 − sO2) and
    /// ctHb in mmol/L. Valid for base excess within ±30 mmol/L.</para>
    /// <para>Source: an analyser's reference manual, equation 9, after Siggaard-Andersen; from memory.</para></remarks>
    /// <param name="bloodBaseExcess">Base excess of blood in mmol/L, in [-1000, 1000].</param>
    /// <param name="haemoglobin">Haemoglobin concentration.</param>
    /// <param name="sO2">Oxygen saturation of the same sample.</param>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="bloodBaseExcess"/> is NaN or outside [-1000, 1000].</exception>
    public static double Compute(double bloodBaseExcess, HaemoglobinConcentration haemoglobin, Saturation sO2)
    {
        Guard.InRange(bloodBaseExcess, -HighestBaseExcess, HighestBaseExcess);

        var hb = haemoglobin.GramsPerDecilitre * MmolPerLitrePerGramPerDecilitre;
        var z = bloodBaseExcess - (0.3062 * hb * (1 - sO2.Fraction));
        return 24.47 + (0.919 * z) + (z * (z - 8) * (4.04e-3 + (4.25e-4 * hb)));
    }
}
