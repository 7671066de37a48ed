namespace UnitVent.Physiology;

/// <summary>A pressure in the airway or the alveoli, or a difference of two. Gas tensions are <see cref="PartialPressure"/>; the two never mix.</summary>
/// <remarks>Held in cmH2O above atmospheric pressure. The default value is 0 cmH2O, a legal P low or PEEP.</remarks>
public readonly record struct AirwayPressure
{
    private const double HectopascalsPerCmH2O = 0.980665; // conventional water column, NIST SP 811 (2008), appendix B.8

    private AirwayPressure(double cmH2O) => CmH2O = cmH2O;

    /// <summary>Gets the value in cmH2O, in [-20, 150].</summary>
    public double CmH2O { get; }

    /// <summary>Creates an airway pressure from cmH2O.</summary>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="cmH2O"/> is NaN or outside [-20, 150].</exception>
    public static AirwayPressure FromCmH2O(double cmH2O) => new(Guard.InRange(cmH2O, -20, 150));

    /// <summary>Creates an airway pressure from hPa (mbar).</summary>
    /// <exception cref="ArgumentOutOfRangeException">The value is NaN or, in cmH2O, outside [-20, 150].</exception>
    public static AirwayPressure FromHectopascals(double hectopascals) => FromCmH2O(hectopascals / HectopascalsPerCmH2O);
}
