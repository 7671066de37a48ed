namespace UnitVent.Physiology;

/// <summary>A body mass: actual, or predicted from height and sex. A name says which.</summary>
/// <remarks>Held in kg. The default value is 0 kg, which no factory produces; equations refuse it.</remarks>
public readonly record struct BodyMass
{
    private BodyMass(double kilograms) => Kilograms = kilograms;

    /// <summary>Gets the value in kg, in (0, 700].</summary>
    public double Kilograms { get; }

    /// <summary>Creates a value from kg.</summary>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="kilograms"/> is NaN or outside (0, 700].</exception>
    public static BodyMass FromKilograms(double kilograms) => new(Guard.InRange(kilograms, Guard.JustAboveZero, 700));
}
