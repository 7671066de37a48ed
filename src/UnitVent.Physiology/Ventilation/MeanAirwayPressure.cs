namespace UnitVent.Physiology;

/// <summary>The mean airway pressure computed from settings, by mode.</summary>
/// <remarks>Source: Marini JJ, Ravenscraft SA. Crit Care Med 1992;20:1461-1472. Pressure support and CPAP have no such
/// formula: there the measured value stands alone.</remarks>
public static class MeanAirwayPressure
{
    /// <summary>Computes the time-weighted mean of the two APRV levels.</summary>
    /// <remarks>Square pressure: no ramp, no swing from breathing, and P low truly reached. A short T low makes the
    /// measured mean higher than this, a slow rise makes it lower.</remarks>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="high"/> is not above <paramref name="low"/>,
    /// or a time is 0 s.</exception>
    public static AirwayPressure Aprv(AirwayPressure high, AirwayPressure low, BreathTime timeHigh, BreathTime timeLow)
    {
        _ = PressureStep.CmH2O(high, low);
        ArgumentOutOfRangeException.ThrowIfEqual(timeHigh, default);
        ArgumentOutOfRangeException.ThrowIfEqual(timeLow, default);

        var shareAtHigh = timeHigh.Seconds / (timeHigh.Seconds + timeLow.Seconds);
        return AirwayPressure.FromCmH2O(double.Lerp(low.CmH2O, high.CmH2O, shareAtHigh));
    }

    /// <summary>Computes PEEP + set pressure × (Ti − rise/2) / Ttot for pressure-controlled breaths.</summary>
    /// <remarks>The pressure rises linearly over <paramref name="riseTime"/>, which may be 0, and is square otherwise.</remarks>
    /// <param name="peep">End-expiratory pressure.</param>
    /// <param name="abovePeep">Inspiratory pressure above PEEP, not above atmosphere; 0 or more.</param>
    /// <param name="inspiratoryTime">Inspiratory time, within one cycle.</param>
    /// <param name="rate">Breath rate, above 0.</param>
    /// <param name="riseTime">Rise time, within the inspiratory time.</param>
    /// <exception cref="ArgumentOutOfRangeException">A condition above does not hold, or the pressures together exceed
    /// the range of <see cref="AirwayPressure"/>.</exception>
    public static AirwayPressure PressureControl(
        AirwayPressure peep, AirwayPressure abovePeep, BreathTime inspiratoryTime, BreathRate rate, BreathTime riseTime)
    {
        ArgumentOutOfRangeException.ThrowIfNegative(abovePeep.CmH2O, nameof(abovePeep));
        ArgumentOutOfRangeException.ThrowIfGreaterThan(inspiratoryTime.Seconds, CycleSeconds(rate), nameof(inspiratoryTime));
        ArgumentOutOfRangeException.ThrowIfGreaterThan(riseTime.Seconds, inspiratoryTime.Seconds, nameof(riseTime));

        var fullPressureSeconds = inspiratoryTime.Seconds - (riseTime.Seconds / 2);
        return AirwayPressure.FromCmH2O(peep.CmH2O + (abovePeep.CmH2O * fullPressureSeconds / CycleSeconds(rate)));
    }

    /// <summary>Computes the mean for volume-controlled breaths of constant flow.</summary>
    /// <remarks>PEEP + {[(peak − plateau) + (plateau − PEEP)/2] × Tflow + (plateau − PEEP) × Tpause} / Ttot:
    /// while gas flows the resistive part is constant and the elastic part grows; in the pause only the plateau is left.</remarks>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="plateau"/> is not above <paramref name="peep"/> or is
    /// above <paramref name="peak"/>, the rate is 0, or flow and pause together exceed one cycle.</exception>
    public static AirwayPressure VolumeControl(
        AirwayPressure peak, AirwayPressure plateau, AirwayPressure peep, BreathTime flowTime, BreathTime pauseTime, BreathRate rate)
    {
        var elastic = PressureStep.CmH2O(plateau, peep);
        ArgumentOutOfRangeException.ThrowIfLessThan(peak.CmH2O, plateau.CmH2O, nameof(peak));
        ArgumentOutOfRangeException.ThrowIfGreaterThan(flowTime.Seconds + pauseTime.Seconds, CycleSeconds(rate), nameof(flowTime));

        var resistive = peak.CmH2O - plateau.CmH2O;
        var pressureTime = ((resistive + (elastic / 2)) * flowTime.Seconds) + (elastic * pauseTime.Seconds);
        return AirwayPressure.FromCmH2O(peep.CmH2O + (pressureTime / CycleSeconds(rate)));
    }

    private static double CycleSeconds(BreathRate rate)
    {
        ArgumentOutOfRangeException.ThrowIfEqual(rate, default);
        return 60 / rate.PerMinute;
    }
}
