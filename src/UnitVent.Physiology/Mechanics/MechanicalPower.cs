namespace UnitVent.Physiology;

/// <summary>The mechanical power of conventional breaths, in J/min.</summary>
/// <remarks>There is no agreed way to compute it in APRV.</remarks>
public static class MechanicalPower
{
    private const double JoulesPerLitreCmH2O = 0.098;

    /// <summary>Computes 0.098 × rate × VT [L] × (peak − driving / 2) for volume-controlled breaths.</summary>
    /// <remarks>Source: Gattinoni L, et al. Intensive Care Med 2016;42:1567-1575, short form; constant flow.</remarks>
    public static double VolumeControlled(BreathRate rate, GasVolume tidal, AirwayPressure peak, AirwayPressure driving)
        => JoulesPerLitreCmH2O * rate.PerMinute * tidal.Litres * (peak.CmH2O - (driving.CmH2O / 2));

    /// <summary>Computes 0.098 × rate × VT [L] × (inspiratory pressure above PEEP + PEEP) for pressure-controlled breaths.</summary>
    /// <remarks>Source: Becher T, et al. Intensive Care Med 2019;45:1321-1323. Reads high when the rise time is not zero.</remarks>
    public static double PressureControlled(BreathRate rate, GasVolume tidal, AirwayPressure abovePeep, AirwayPressure peep)
        => JoulesPerLitreCmH2O * rate.PerMinute * tidal.Litres * (abovePeep.CmH2O + peep.CmH2O);
}
