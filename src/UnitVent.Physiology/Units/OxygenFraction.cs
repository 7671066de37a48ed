namespace UnitVent.Physiology;

/// <summary>The fraction of oxygen in inspired gas, set or measured.</summary>
/// <remarks>Held as a fraction. The default value is 0, which no factory produces; equations refuse it.</remarks>
public readonly record struct OxygenFraction
{
    private OxygenFraction(double fraction) => Fraction = fraction;

    /// <summary>Gets the value as a fraction, in [0.18, 1].</summary>
    public double Fraction { get; }

    /// <summary>Creates a value from a fraction.</summary>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="fraction"/> is NaN or outside [0.18, 1].</exception>
    public static OxygenFraction FromFraction(double fraction) => new(Guard.InRange(fraction, 0.18, 1));
}
