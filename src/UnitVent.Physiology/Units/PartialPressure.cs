namespace UnitVent.Physiology;

/// <summary>A gas partial pressure such as PaCO2. Airway pressures are <see cref="AirwayPressure"/>; the two never mix.</summary>
/// <remarks>Held in mmHg. The default value is 0 mmHg, which no measurement produces.</remarks>
public readonly record struct PartialPressure
{
    // The standard atmosphere, 101 325 Pa, is 760 mmHg: NIST SP 811 (2008), appendix B.8.
    private const double KilopascalsPerMmHg = 101.325 / 760;

    private PartialPressure(double mmHg) => MmHg = mmHg;

    /// <summary>Gets the value in mmHg, in [0, 1000].</summary>
    public double MmHg { get; }

    /// <summary>Gets the value in kPa, in [0, 133.33].</summary>
    public double Kilopascals => MmHg * KilopascalsPerMmHg;

    /// <summary>Creates a partial pressure from mmHg.</summary>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="mmHg"/> is NaN or outside [0, 1000].</exception>
    public static PartialPressure FromMmHg(double mmHg) => new(Guard.InRange(mmHg, 0, 1000));

    /// <summary>Creates a partial pressure from kPa.</summary>
    /// <exception cref="ArgumentOutOfRangeException">The value is NaN or, in mmHg, outside [0, 1000].</exception>
    public static PartialPressure FromKilopascals(double kilopascals) => FromMmHg(kilopascals / KilopascalsPerMmHg);
}
