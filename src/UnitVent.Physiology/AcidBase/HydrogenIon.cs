namespace UnitVent.Physiology;

/// <summary>Acidity as hydrogen ion concentration in nmol/L, and its rule of thumb.</summary>
/// <remarks>Definition: [H+] = 10^(9 − pH) nmol/L, activity taken as concentration.</remarks>
public static class HydrogenIon
{
    /// <summary>Computes the concentration in nmol/L, in [3.16, 1000].</summary>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="pH"/> is its default, 0.</exception>
    public static double NmolPerLitre(BloodPH pH)
    {
        ArgumentOutOfRangeException.ThrowIfEqual(pH, default);

        return Math.Pow(10, 9 - pH.Value);
    }

    /// <summary>Computes the pH of a concentration.</summary>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="nmolPerLitre"/> is NaN, or the result is outside [6, 8.5].</exception>
    public static BloodPH PH(double nmolPerLitre) => BloodPH.FromPH(9 - Math.Log10(Guard.Positive(nmolPerLitre)));

    /// <summary>Computes 24 × PCO2 [mmHg] / HCO3 [mmol/L], in nmol/L.</summary>
    /// <remarks>Source: Kassirer JP, Bleich HL. N Engl J Med 1965;272:1067-1068 (from memory). For the head, not for the chart: it reads
    /// 0.4 % below <see cref="HendersonHasselbalch"/>.</remarks>
    /// <exception cref="ArgumentOutOfRangeException">An argument is its default, 0.</exception>
    public static double RuleOfThumbNmolPerLitre(PartialPressure pCO2, Bicarbonate bicarbonate)
        => 24 * Guard.Positive(pCO2.MmHg, nameof(pCO2)) / Guard.Positive(bicarbonate.MmolPerLitre, nameof(bicarbonate));
}
