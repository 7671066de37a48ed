namespace UnitVent.Physiology;

/// <summary>A bicarbonate concentration of plasma as an analyser reports it.</summary>
/// <remarks>Held in mmol/L. The default value is 0 mmol/L, which no measurement produces.</remarks>
public readonly record struct Bicarbonate
{
    private Bicarbonate(double mmolPerLitre) => MmolPerLitre = mmolPerLitre;

    /// <summary>Gets the value in mmol/L, in [0, 100].</summary>
    public double MmolPerLitre { get; }

    /// <summary>Creates a value from mmol/L.</summary>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="mmolPerLitre"/> is NaN or outside [0, 100].</exception>
    public static Bicarbonate FromMmolPerLitre(double mmolPerLitre) => new(Guard.InRange(mmolPerLitre, 0, 100));
}
