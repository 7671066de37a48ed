namespace UnitVent.Physiology;

/// <summary>The oxygenation criterion of the ARDS definitions; their other criteria (onset, opacities, heart) are a person's to judge.</summary>
/// <remarks>Both need an end-expiratory pressure of at least 5 cmH2O. In APRV, where P low is often 0 and the alveoli never fall to it, the
/// caller gives the mean airway pressure and says so: common practice, in neither definition.</remarks>
public static class ArdsOxygenation
{
    private const double LowestPressureCmH2O = 5;
    private const double SeaLevelMmHg = 760;
    private const double LowAltitudeMetres = 1000;
    private const double HighestPfMmHg = 6000; // beyond what tension and oxygen fraction can make it

    private static BarometricPressure LowAltitude => BarometricPressure.FromAltitude(LowAltitudeMetres);

    /// <summary>Classifies by P/F: mild above 200 to 300 mmHg, moderate above 100 to 200, severe to 100.</summary>
    /// <remarks>Source: ARDS Definition Task Force, JAMA 2012;307:2526-2533; scaled where the pressure is below that of 1000 m
    /// (674 mmHg) in the standard atmosphere.</remarks>
    /// <param name="pfMmHg">P/F in mmHg, in [0, 6000].</param>
    /// <param name="pressure">PEEP, CPAP or, in APRV, mean airway pressure.</param>
    /// <param name="barometric">Station pressure.</param>
    /// <param name="scaling">What is scaled in the mountains.</param>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="pfMmHg"/> is NaN or outside its range, or
    /// <paramref name="barometric"/> is its default.</exception>
    public static OxygenationClass FromPaO2(double pfMmHg, AirwayPressure pressure, BarometricPressure barometric, AltitudeScaling scaling)
    {
        Guard.InRange(pfMmHg, 0, HighestPfMmHg);
        ArgumentOutOfRangeException.ThrowIfEqual(barometric, default);

        var share = barometric.MmHg < LowAltitude.MmHg ? barometric.MmHg / SeaLevelMmHg : 1;
        return scaling switch
        {
            AltitudeScaling.Limits => Classify(pfMmHg, pressure, 300 * share, 200 * share, 100 * share),
            AltitudeScaling.Ratio => Classify(pfMmHg * share, pressure, 300, 200, 100),
        };
    }

    /// <summary>Classifies by S/F: mild above 235 to 315, moderate above 148 to 235, severe to 148.</summary>
    /// <remarks>Source: Matthay MA, et al. Am J Respir Crit Care Med 2024;209:37-47, read through a summary. Not scaled for altitude.</remarks>
    /// <param name="spO2">Oximeter saturation; above 97 % nothing is classified.</param>
    /// <param name="fiO2">Inspired oxygen fraction.</param>
    /// <param name="pressure">PEEP, CPAP or, in APRV, mean airway pressure.</param>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="fiO2"/> is its default.</exception>
    public static OxygenationClass FromSpO2(Saturation spO2, OxygenFraction fiO2, AirwayPressure pressure)
    {
        ArgumentOutOfRangeException.ThrowIfEqual(fiO2, default);

        return SpO2FiO2Ratio.IsInformative(spO2)
            ? Classify(SpO2FiO2Ratio.Compute(spO2, fiO2), pressure, 315, 235, 148)
            : OxygenationClass.NotClassified;
    }

    private static OxygenationClass Classify(double ratio, AirwayPressure pressure, double mild, double moderate, double severe)
    {
        if (pressure.CmH2O < LowestPressureCmH2O)
        {
            return OxygenationClass.NotClassified;
        }

        return ratio > mild ? OxygenationClass.AboveMild
            : ratio > moderate ? OxygenationClass.Mild
            : ratio > severe ? OxygenationClass.Moderate
            : OxygenationClass.Severe;
    }
}
