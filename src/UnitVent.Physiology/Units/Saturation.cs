namespace UnitVent.Physiology;

/// <summary>The oxygen saturation of haemoglobin, by oximetry or of a blood sample.</summary>
/// <remarks>Held in percent. The default value is 0 %, which no measurement produces.</remarks>
public readonly record struct Saturation
{
    private Saturation(double percent) => Percent = percent;

    /// <summary>Gets the value in percent, in [0, 100].</summary>
    public double Percent { get; }

    /// <summary>Gets the value as a fraction, in [0, 1].</summary>
    public double Fraction => Percent / 100;

    /// <summary>Creates a value from percent.</summary>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="percent"/> is NaN or outside [0, 100].</exception>
    public static Saturation FromPercent(double percent) => new(Guard.InRange(percent, 0, 100));
}
