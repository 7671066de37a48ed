namespace UnitVent.Physiology;

/// <summary>Breaths or releases in a minute.</summary>
/// <remarks>Held in 1/min. The default value is 0 /min.</remarks>
public readonly record struct BreathRate
{
    private BreathRate(double perMinute) => PerMinute = perMinute;

    /// <summary>Gets the value in 1/min, in [0, 150].</summary>
    public double PerMinute { get; }

    /// <summary>Creates a value from 1/min.</summary>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="perMinute"/> is NaN or outside [0, 150].</exception>
    public static BreathRate FromPerMinute(double perMinute) => new(Guard.InRange(perMinute, 0, 150));
}
