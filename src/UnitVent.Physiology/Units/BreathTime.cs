namespace UnitVent.Physiology;

/// <summary>A length of time within one breath or one release cycle, or a time constant.</summary>
/// <remarks>Held in seconds. The default value is 0 s.</remarks>
public readonly record struct BreathTime
{
    private BreathTime(double seconds) => Seconds = seconds;

    /// <summary>Gets the value in s, in [0, 60].</summary>
    public double Seconds { get; }

    /// <summary>Creates a value from s.</summary>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="seconds"/> is NaN or outside [0, 60].</exception>
    public static BreathTime FromSeconds(double seconds) => new(Guard.InRange(seconds, 0, 60));
}
