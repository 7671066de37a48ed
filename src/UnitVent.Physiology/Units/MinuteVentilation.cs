namespace UnitVent.Physiology;

/// <summary>The gas volume moved in a minute, by all breaths or by one kind of them.</summary>
/// <remarks>Held in L/min. The default value is 0 L/min.</remarks>
public readonly record struct MinuteVentilation
{
    private MinuteVentilation(double litresPerMinute) => LitresPerMinute = litresPerMinute;

    /// <summary>Gets the value in L/min, in [0, 60].</summary>
    public double LitresPerMinute { get; }

    /// <summary>Gets the value in mL/min, in [0, 60 000].</summary>
    public double MillilitresPerMinute => LitresPerMinute * 1000;

    /// <summary>Creates a value from L/min.</summary>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="litresPerMinute"/> is NaN or outside [0, 60].</exception>
    public static MinuteVentilation FromLitresPerMinute(double litresPerMinute) => new(Guard.InRange(litresPerMinute, 0, 60));
}
