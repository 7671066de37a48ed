namespace UnitVent.Physiology;

/// <summary>The size of a gas flow, without direction; an expiratory flow is a positive number too.</summary>
/// <remarks>Held in L/min. The default value is 0 L/min.</remarks>
public readonly record struct GasFlow
{
    private GasFlow(double litresPerMinute) => LitresPerMinute = litresPerMinute;

    /// <summary>Gets the value in L/min, in [0, 300].</summary>
    public double LitresPerMinute { get; }

    /// <summary>Creates a value from L/min.</summary>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="litresPerMinute"/> is NaN or outside [0, 300].</exception>
    public static GasFlow FromLitresPerMinute(double litresPerMinute) => new(Guard.InRange(litresPerMinute, 0, 300));
}
