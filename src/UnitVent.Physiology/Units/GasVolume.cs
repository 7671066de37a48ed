namespace UnitVent.Physiology;

/// <summary>The volume of one breath or one release.</summary>
/// <remarks>Held in mL. The default value is 0 mL.</remarks>
public readonly record struct GasVolume
{
    private GasVolume(double millilitres) => Millilitres = millilitres;

    /// <summary>Gets the value in mL, in [0, 5000].</summary>
    public double Millilitres { get; }

    /// <summary>Gets the value in L, in [0, 5].</summary>
    public double Litres => Millilitres / 1000;

    /// <summary>Creates a value from mL.</summary>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="millilitres"/> is NaN or outside [0, 5000].</exception>
    public static GasVolume FromMillilitres(double millilitres) => new(Guard.InRange(millilitres, 0, 5000));
}
