namespace UnitVent.Physiology;

/// <summary>The standard oxygen dissociation curve of human blood, both ways.</summary>
/// <remarks>Standard conditions: 37 °C, pH 7.40, PCO2 40 mmHg, no abnormal haemoglobin. For checking whether readings fit
/// together; an oximeter saturation is never charted as a tension.</remarks>
public static class OxygenDissociation
{
    private const double LowestTemperatureC = 25;
    private const double HighestTemperatureC = 43;

    /// <summary>Computes the saturation at an oxygen tension.</summary>
    /// <remarks><para>S = 1 / [23400 / (P³ + 150 P) + 1], P in mmHg; within 0.55 points of the standard curve.</para>
    /// <para>Source: Severinghaus JW. J Appl Physiol 1979;46:599-602, equation 1.</para></remarks>
    public static Saturation Saturation(PartialPressure pO2)
    {
        var p = pO2.MmHg;
        var fraction = 1 / ((23400 / ((p * p * p) + (150 * p))) + 1);
        return Physiology.Saturation.FromPercent(100 * fraction);
    }

    /// <summary>Computes the oxygen tension at a saturation; the exact inverse of <see cref="Saturation"/>.</summary>
    /// <remarks><para>With A = 11700 / (1/S − 1) and B = √(50³ + A²): P = ∛(B + A) − ∛(B − A), in mmHg.</para>
    /// <para>Source: Ellis RK. J Appl Physiol 1989;67:902. Above 97 % a small error of saturation is a large one of tension.</para></remarks>
    /// <exception cref="ArgumentOutOfRangeException">The saturation is 0 % or 100 %, or so near to 100 % that the tension
    /// exceeds 1000 mmHg.</exception>
    public static PartialPressure PartialPressureFor(Saturation saturation)
    {
        var s = Guard.InRange(saturation.Fraction, Guard.JustAboveZero, Guard.JustBelowOne, nameof(saturation));
        var a = 11700 / ((1 / s) - 1);
        var b = Math.Sqrt((50 * 50 * 50) + (a * a));
        var larger = Math.Cbrt(b + a);
        return PartialPressure.FromMmHg(larger - (50 / larger)); // (B + A)(B − A) = 50³, so the second root is 50 over the first
    }

    /// <summary>Computes the oxygen tension at a saturation by the published approximation, for comparison with other work.</summary>
    /// <remarks><para>ln P = 0.385 ln[S / (1 − S)] + 3.32 − 1/(72 S) − S⁶/6, P in mmHg; up to 1 mmHg from
    /// <see cref="PartialPressureFor"/> between 50 and 95 %, and no inverse of anything here.</para>
    /// <para>Source: Severinghaus JW. J Appl Physiol 1979;46:599-602, equation 2.</para></remarks>
    /// <exception cref="ArgumentOutOfRangeException">As for <see cref="PartialPressureFor"/>.</exception>
    public static PartialPressure ApproximatePartialPressureFor(Saturation saturation)
    {
        var s = Guard.InRange(saturation.Fraction, Guard.JustAboveZero, Guard.JustBelowOne, nameof(saturation));
        return PartialPressure.FromMmHg(Math.Exp((0.385 * Math.Log(s / (1 - s))) + 3.32 - (1 / (72 * s)) - (Math.Pow(s, 6) / 6)));
    }

    /// <summary>Computes d ln PO2 / dT of blood cooled or warmed without loss of gas, per °C.</summary>
    /// <remarks>0.058 / [0.243 (P/100)^3.88 + 1] + 0.013. Source: Severinghaus JW. J Appl Physiol 1979;46:599-602.</remarks>
    public static double TensionRisePerDegree(PartialPressure pO2) => (0.058 / ((0.243 * Math.Pow(pO2.MmHg / 100, 3.88)) + 1)) + 0.013;

    /// <summary>Computes d ln PO2 / d pH at constant saturation: −1.4 at 10 mmHg, −0.9 at 100 mmHg.</summary>
    /// <remarks>(P / 26.6)^0.184 − 2.2. Source: Severinghaus JW. J Appl Physiol 1979;46:599-602.</remarks>
    public static double TensionRisePerPH(PartialPressure pO2) => Math.Pow(pO2.MmHg / 26.6, 0.184) - 2.2;

    /// <summary>Computes the tension that has, on the standard curve, the saturation <paramref name="pO2"/> has under these conditions.</summary>
    /// <remarks><para>P × 10^[0.024 (37 − T) + 0.40 (pH − 7.40) + 0.06 (log 40 − log PCO2)].</para>
    /// <para>Source: Kelman GR. J Appl Physiol 1966;21:1375-1376.</para></remarks>
    /// <param name="pO2">Oxygen tension at the patient's temperature.</param>
    /// <param name="pH">pH at the patient's temperature.</param>
    /// <param name="temperatureC">Temperature in °C, in [25, 43].</param>
    /// <param name="pCO2">Carbon dioxide tension, above 0.</param>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="temperatureC"/> is NaN or outside [25, 43],
    /// <paramref name="pH"/> or <paramref name="pCO2"/> is its default, or the result exceeds 1000 mmHg.</exception>
    public static PartialPressure VirtualPartialPressure(PartialPressure pO2, BloodPH pH, double temperatureC, PartialPressure pCO2)
    {
        ArgumentOutOfRangeException.ThrowIfEqual(pH, default);
        ArgumentOutOfRangeException.ThrowIfEqual(pCO2, default);

        var temperatureShift = 0.024 * (37 - Guard.InRange(temperatureC, LowestTemperatureC, HighestTemperatureC));
        var acidShift = 0.40 * (pH.Value - 7.40);
        var carbonDioxideShift = 0.06 * Math.Log10(40 / pCO2.MmHg);
        return PartialPressure.FromMmHg(pO2.MmHg * Math.Pow(10, temperatureShift + acidShift + carbonDioxideShift));
    }
}
