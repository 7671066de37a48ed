namespace UnitVent.Physiology;

/// <summary>The station pressure of the air at the bedside, not reduced to sea level.</summary>
/// <remarks>Held in mmHg. The default value is 0 mmHg, which no factory produces; equations refuse it.</remarks>
public readonly record struct BarometricPressure
{
    private const double SeaLevelMmHg = 760;

    private BarometricPressure(double mmHg) => MmHg = mmHg;

    /// <summary>Gets the value in mmHg, in [200, 900].</summary>
    public double MmHg { get; }

    /// <summary>Creates a barometric pressure from mmHg.</summary>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="mmHg"/> is NaN or outside [200, 900].</exception>
    public static BarometricPressure FromMmHg(double mmHg) => new(Guard.InRange(mmHg, 200, 900));

    /// <summary>Estimates the barometric pressure from altitude; a measured station pressure is better.</summary>
    /// <remarks><para>PB [mmHg] = 760 × (1 − 2.25577·10⁻⁵ × h [m])^5.25588.</para>
    /// <para>Source: ISO 2533:1975, standard atmosphere, troposphere. Weather moves the true value by up to about 30 mmHg
    /// and at inhabited latitudes it is some mmHg higher in the mountains.</para></remarks>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="metres"/> is NaN or outside [-500, 9000].</exception>
    public static BarometricPressure FromAltitude(double metres)
        => FromMmHg(SeaLevelMmHg * Math.Pow(1 - (2.25577e-5 * Guard.InRange(metres, -500, 9000)), 5.25588));

    /// <summary>Estimates the barometric pressure of inhabited mountains from altitude; a measured station pressure is better.</summary>
    /// <remarks><para>PB [mmHg] = exp(6.63268 − 0.1112 h − 0.00149 h²), h in km; 4–13 mmHg above the standard atmosphere
    /// from 1 to 4 km, more beyond, and half a mmHg below it at sea level.</para>
    /// <para>Source: West JB. J Appl Physiol 1996;81:1850-1854, from memory. For latitudes up to about 30° and for summer beyond.</para></remarks>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="metres"/> is NaN or outside [0, 9000].</exception>
    public static BarometricPressure FromInhabitedAltitude(double metres)
    {
        var kilometres = Guard.InRange(metres, 0, 9000) / 1000;
        return FromMmHg(Math.Exp(6.63268 - (0.1112 * kilometres) - (0.00149 * kilometres * kilometres)));
    }
}
