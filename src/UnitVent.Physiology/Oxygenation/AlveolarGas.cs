namespace UnitVent.Physiology;

/// <summary>The alveolar gas equation and the two comparisons of arterial with alveolar oxygen.</summary>
public static class AlveolarGas
{
    private const double WaterVapourMmHg = 47; // saturated at 37 °C
    private const double RespiratoryQuotient = 0.8;

    /// <summary>Says whether the equation leaves a positive oxygen tension; on little oxygen and a very high PaCO2 it does not.</summary>
    public static bool IsDefined(OxygenFraction fiO2, BarometricPressure barometric, PartialPressure paCO2)
        => Evaluate(fiO2, barometric, paCO2) > 0;

    /// <summary>Computes the ideal alveolar oxygen tension.</summary>
    /// <remarks><para>PAO2 = FiO2 × (PB − 47) − PaCO2 × [FiO2 + (1 − FiO2)/R], all in mmHg, R = 0.8, at 37 °C.</para>
    /// <para>Source: Fenn WO, et al. Am J Physiol 1946;146:637-653 (citation from memory). This full form is used because
    /// the short one, with PaCO2/R alone, reads 10 mmHg low at FiO2 1 and PaCO2 40.</para></remarks>
    /// <exception cref="ArgumentOutOfRangeException">The result is not above zero (see <see cref="IsDefined"/>), or
    /// <paramref name="fiO2"/> or <paramref name="barometric"/> is its default, 0.</exception>
    public static PartialPressure AlveolarPO2(OxygenFraction fiO2, BarometricPressure barometric, PartialPressure paCO2)
    {
        ArgumentOutOfRangeException.ThrowIfEqual(fiO2, default);
        ArgumentOutOfRangeException.ThrowIfEqual(barometric, default);
        var alveolar = Evaluate(fiO2, barometric, paCO2);
        ArgumentOutOfRangeException.ThrowIfNegativeOrZero(alveolar, nameof(paCO2));

        return PartialPressure.FromMmHg(alveolar);
    }

    /// <summary>Computes PAO2 − PaO2 in mmHg. Clearly negative values mean that the readings do not belong together.</summary>
    public static double ArterialGradientMmHg(PartialPressure alveolar, PartialPressure arterial) => alveolar.MmHg - arterial.MmHg;

    /// <summary>Computes PaO2 / PAO2, which depends less on FiO2 than the gradient does.</summary>
    /// <remarks>Source: Gilbert R, Keighley JF. Am Rev Respir Dis 1974;109:142-145 (citation from memory).</remarks>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="alveolar"/> is its default, 0 mmHg.</exception>
    public static double ArterialAlveolarRatio(PartialPressure alveolar, PartialPressure arterial)
        => arterial.MmHg / Guard.Positive(alveolar.MmHg, nameof(alveolar));

    /// <summary>Computes the alveolar–arterial difference expected while breathing room air, in mmHg: age / 4 + 4.</summary>
    /// <remarks>Source: from memory. On room air only: with more oxygen the difference grows and nothing is expected of it.</remarks>
    /// <param name="years">Age in years, in [18, 120].</param>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="years"/> is NaN or outside its range.</exception>
    public static double ExpectedGradientOnAirMmHg(double years) => (Guard.InRange(years, 18, 120) / 4) + 4;

    private static double Evaluate(OxygenFraction fiO2, BarometricPressure barometric, PartialPressure paCO2)
    {
        var inspired = fiO2.Fraction * (barometric.MmHg - WaterVapourMmHg);
        return inspired - (paCO2.MmHg * (fiO2.Fraction + ((1 - fiO2.Fraction) / RespiratoryQuotient)));
    }
}
