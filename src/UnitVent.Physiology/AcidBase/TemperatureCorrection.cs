namespace UnitVent.Physiology;

/// <summary>A gas measured at 37 °C expressed at the patient's temperature, and back.</summary>
/// <remarks><para>Source: CLSI C46 (formerly NCCLS), from memory.</para>
/// <para>Gases are charted and trended at 37 °C. A corrected value is shown beside that, labelled with its temperature, and never enters
/// a rule, a trend or another equation. Temperatures are in °C, in [25, 43].</para></remarks>
public static class TemperatureCorrection
{
    private const double AnalyserC = 37;
    private const double LowestC = 25;
    private const double HighestC = 43;
    private const double PHPerDegree = -0.0147;
    private const double PHPerDegreeAndPH = 0.0065;
    private const double LogPCO2PerDegree = 0.019;
    private const int Rounds = 100; // the error shrinks to 0.68 or less in each

    /// <summary>Computes pH + [−0.0147 + 0.0065 (7.40 − pH)] × (T − 37).</summary>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="temperatureC"/> is NaN or outside [25, 43],
    /// <paramref name="at37"/> is its default, or the result is outside [6, 8.5].</exception>
    public static BloodPH PH(BloodPH at37, double temperatureC)
    {
        ArgumentOutOfRangeException.ThrowIfEqual(at37, default);

        var shift = PHPerDegree + (PHPerDegreeAndPH * (7.40 - at37.Value));
        return BloodPH.FromPH(at37.Value + (shift * Degrees(temperatureC)));
    }

    /// <summary>Computes the pH at 37 °C; the exact inverse of <see cref="PH"/>.</summary>
    /// <exception cref="ArgumentOutOfRangeException">As for <see cref="PH"/>.</exception>
    public static BloodPH PHAt37(BloodPH corrected, double temperatureC)
    {
        ArgumentOutOfRangeException.ThrowIfEqual(corrected, default);

        var degrees = Degrees(temperatureC);
        var shiftAtPH0 = (PHPerDegree + (PHPerDegreeAndPH * 7.40)) * degrees;
        return BloodPH.FromPH((corrected.Value - shiftAtPH0) / (1 - (PHPerDegreeAndPH * degrees)));
    }

    /// <summary>Computes PCO2 × 10^[0.019 (T − 37)].</summary>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="temperatureC"/> is NaN or outside [25, 43], or the result exceeds
    /// 1000 mmHg.</exception>
    public static PartialPressure PCO2(PartialPressure at37, double temperatureC)
        => PartialPressure.FromMmHg(at37.MmHg * Math.Pow(10, LogPCO2PerDegree * Degrees(temperatureC)));

    /// <summary>Computes the PCO2 at 37 °C; the exact inverse of <see cref="PCO2"/>.</summary>
    /// <exception cref="ArgumentOutOfRangeException">As for <see cref="PCO2"/>.</exception>
    public static PartialPressure PCO2At37(PartialPressure corrected, double temperatureC)
        => PartialPressure.FromMmHg(corrected.MmHg / Math.Pow(10, LogPCO2PerDegree * Degrees(temperatureC)));

    /// <summary>Computes PO2 × 10^[k (T − 37)], k = (5.49·10⁻¹¹ PO2^3.88 + 0.071) / (9.72·10⁻⁹ PO2^3.88 + 2.30), PO2 in mmHg.</summary>
    /// <exception cref="ArgumentOutOfRangeException">As for <see cref="PCO2"/>.</exception>
    public static PartialPressure PO2(PartialPressure at37, double temperatureC)
        => PartialPressure.FromMmHg(at37.MmHg * PO2Factor(at37.MmHg, Degrees(temperatureC)));

    /// <summary>Computes the PO2 at 37 °C; the inverse of <see cref="PO2"/>, by iteration to the last digits of a double.</summary>
    /// <exception cref="ArgumentOutOfRangeException">As for <see cref="PCO2"/>.</exception>
    public static PartialPressure PO2At37(PartialPressure corrected, double temperatureC)
    {
        var degrees = Degrees(temperatureC);
        var at37 = corrected.MmHg;
        foreach (var _ in Enumerable.Range(0, Rounds))
        {
            at37 = corrected.MmHg / PO2Factor(at37, degrees);
        }

        return PartialPressure.FromMmHg(at37);
    }

    private static double Degrees(double temperatureC) => Guard.InRange(temperatureC, LowestC, HighestC) - AnalyserC;

    private static double PO2Factor(double at37, double degrees)
    {
        var p = Math.Pow(at37, 3.88);
        return Math.Pow(10, ((5.49e-11 * p) + 0.071) / ((9.72e-9 * p) + 2.30) * degrees);
    }
}
