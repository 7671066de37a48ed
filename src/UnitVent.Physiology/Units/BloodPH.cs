namespace UnitVent.Physiology;

/// <summary>The pH of blood, at 37 °C unless an equation names another temperature.</summary>
/// <remarks>A number without unit. The default value is 0, which no factory produces; equations refuse it.</remarks>
public readonly record struct BloodPH
{
    private BloodPH(double pH) => Value = pH;

    /// <summary>Gets the value on the pH scale, in [6, 8.5].</summary>
    public double Value { get; }

    /// <summary>Creates a value from a pH.</summary>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="pH"/> is NaN or outside [6, 8.5].</exception>
    public static BloodPH FromPH(double pH) => new(Guard.InRange(pH, 6, 8.5));
}
