namespace UnitVent.Physiology;

/// <summary>A flow resistance of airways, tube and valve together.</summary>
/// <remarks>Held in cmH2O·s/L. The default value is 0 cmH2O·s/L. The wide upper limit only catches slips of unit.</remarks>
public readonly record struct Resistance
{
    private Resistance(double cmH2OSecondsPerLitre) => CmH2OSecondsPerLitre = cmH2OSecondsPerLitre;

    /// <summary>Gets the value in cmH2O·s/L, in [0, 20 000].</summary>
    public double CmH2OSecondsPerLitre { get; }

    /// <summary>Creates a value from cmH2O·s/L.</summary>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="cmH2OSecondsPerLitre"/> is NaN or outside [0, 20 000].</exception>
    public static Resistance FromCmH2OSecondsPerLitre(double cmH2OSecondsPerLitre) => new(Guard.InRange(cmH2OSecondsPerLitre, 0, 20000));
}
