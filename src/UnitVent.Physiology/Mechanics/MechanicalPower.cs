namespace UnitVent.Physiology;

/// <summary>The mechanical power of conventional breaths, in J/min.</summary>
/// <remarks>There is no agreed way to compute it in APRV.</remarks>
public static class MechanicalPower
{
    private const double JoulesPerLitreCmH2O = 0.098;
    private const double LowestTimeRatio = 0.05;
    private const double HighestTimeRatio = 20;

    /// <summary>Computes 0.098 × rate × VT [L] × (peak − driving / 2) for volume-controlled breaths.</summary>
    /// <remarks>Source: Gattinoni L, et al. Intensive Care Med 2016;42:1567-1575, short form; constant flow.</remarks>
    public static double VolumeControlled(BreathRate rate, GasVolume tidal, AirwayPressure peak, AirwayPressure driving)
        => JoulesPerLitreCmH2O * rate.PerMinute * tidal.Litres * (peak.CmH2O - (driving.CmH2O / 2));

    /// <summary>Computes the long form of the same, from mechanics instead of pressures read.</summary>
    /// <remarks><para>0.098 × rate × {VT² × [E/2 + rate × (1 + I:E) / (60 × I:E) × R] + VT × PEEP}, VT in L, E = 1 / compliance.</para>
    /// <para>Source: Gattinoni L, et al. Intensive Care Med 2016;42:1567-1575, as quoted in Wu HP, et al. J Clin Monit Comput 2022.</para></remarks>
    /// <param name="rate">Breath rate.</param>
    /// <param name="tidal">Tidal volume.</param>
    /// <param name="compliance">Static compliance.</param>
    /// <param name="inspiratoryToExpiratory">Inspiratory over expiratory time, in [0.05, 20].</param>
    /// <param name="airway">Inspiratory resistance.</param>
    /// <param name="peep">End-expiratory pressure.</param>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="compliance"/> is its default, 0, or
    /// <paramref name="inspiratoryToExpiratory"/> is NaN or outside [0.05, 20].</exception>
    public static double FromMechanics(
        BreathRate rate, GasVolume tidal, Compliance compliance, double inspiratoryToExpiratory, Resistance airway, AirwayPressure peep)
    {
        ArgumentOutOfRangeException.ThrowIfEqual(compliance, default);
        Guard.InRange(inspiratoryToExpiratory, LowestTimeRatio, HighestTimeRatio);

        var flowPerVolume = rate.PerMinute * (1 + inspiratoryToExpiratory) / (60 * inspiratoryToExpiratory);
        var elastance = 1000 / compliance.MlPerCmH2O;
        var meanAbovePeep = tidal.Litres * ((elastance / 2) + (flowPerVolume * airway.CmH2OSecondsPerLitre));
        return JoulesPerLitreCmH2O * rate.PerMinute * tidal.Litres * (meanAbovePeep + peep.CmH2O);
    }

    /// <summary>Computes VE × (peak + PEEP + F/6) / 20 for volume-controlled breaths without a hold; VE and flow F in L/min.</summary>
    /// <remarks>Source: Giosa L, et al. Intensive Care Med Exp 2019;7:61. It takes a resistance of 10 cmH2O·s/L for granted.</remarks>
    public static double WithoutHold(MinuteVentilation ventilation, AirwayPressure peak, AirwayPressure peep, GasFlow inspiratory)
        => ventilation.LitresPerMinute * (peak.CmH2O + peep.CmH2O + (inspiratory.LitresPerMinute / 6)) / 20;

    /// <summary>Computes 0.098 × rate × VT [L] × (inspiratory pressure above PEEP + PEEP) for pressure-controlled breaths.</summary>
    /// <remarks>Source: Becher T, et al. Intensive Care Med 2019;45:1321-1323. Reads high when the rise time is not zero.</remarks>
    public static double PressureControlled(BreathRate rate, GasVolume tidal, AirwayPressure abovePeep, AirwayPressure peep)
        => JoulesPerLitreCmH2O * rate.PerMinute * tidal.Litres * (abovePeep.CmH2O + peep.CmH2O);
}
