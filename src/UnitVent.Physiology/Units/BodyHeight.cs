namespace UnitVent.Physiology;

/// <summary>The standing height of an adult, or its estimate from another length.</summary>
/// <remarks>Held in cm. The default value is 0 cm, which no factory produces; equations refuse it.</remarks>
public readonly record struct BodyHeight
{
    private BodyHeight(double centimetres) => Centimetres = centimetres;

    /// <summary>Gets the value in cm, in [120, 230].</summary>
    public double Centimetres { get; }

    /// <summary>Creates a value from cm.</summary>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="centimetres"/> is NaN or outside [120, 230].</exception>
    public static BodyHeight FromCentimetres(double centimetres) => new(Guard.InRange(centimetres, 120, 230));
}
