namespace UnitVent.Physiology;

/// <summary>Driving pressure and static compliance of conventional breaths.</summary>
/// <remarks>For a passive patient and an inspiratory hold of at least 0.5 s (ARDS Network, N Engl J Med 2000;342:1301-1308).
/// Source: Amato MBP, et al. N Engl J Med 2015;372:747-755. Total PEEP is set PEEP plus measured auto-PEEP.</remarks>
public static class StaticMechanics
{
    private const double HighestComplianceMlPerCmH2O = 500; // what a Compliance holds

    /// <summary>Says whether <see cref="StaticCompliance"/> gives a value: plateau above PEEP, a result in (0, 500] mL/cmH2O.</summary>
    public static bool IsDefined(GasVolume tidal, AirwayPressure plateau, AirwayPressure totalPeep)
        => tidal != default
            && plateau.CmH2O > totalPeep.CmH2O
            && tidal.Millilitres / DrivingPressure(plateau, totalPeep).CmH2O <= HighestComplianceMlPerCmH2O;

    /// <summary>Computes plateau − total PEEP.</summary>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="plateau"/> is not above <paramref name="totalPeep"/>.</exception>
    public static AirwayPressure DrivingPressure(AirwayPressure plateau, AirwayPressure totalPeep)
        => AirwayPressure.FromCmH2O(PressureStep.CmH2O(plateau, totalPeep));

    /// <summary>Computes tidal volume / driving pressure.</summary>
    /// <exception cref="ArgumentOutOfRangeException">The value is not defined, see <see cref="IsDefined"/>.</exception>
    public static Compliance StaticCompliance(GasVolume tidal, AirwayPressure plateau, AirwayPressure totalPeep)
        => Compliance.FromMlPerCmH2O(tidal.Millilitres / DrivingPressure(plateau, totalPeep).CmH2O);
}
