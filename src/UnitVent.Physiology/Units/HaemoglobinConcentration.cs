namespace UnitVent.Physiology;

/// <summary>The haemoglobin concentration of blood.</summary>
/// <remarks>Held in g/dL. The default value is 0 g/dL, which no measurement produces.</remarks>
public readonly record struct HaemoglobinConcentration
{
    private HaemoglobinConcentration(double gramsPerDecilitre) => GramsPerDecilitre = gramsPerDecilitre;

    /// <summary>Gets the value in g/dL, in [0, 30].</summary>
    public double GramsPerDecilitre { get; }

    /// <summary>Creates a value from g/dL.</summary>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="gramsPerDecilitre"/> is NaN or outside [0, 30].</exception>
    public static HaemoglobinConcentration FromGramsPerDecilitre(double gramsPerDecilitre) => new(Guard.InRange(gramsPerDecilitre, 0, 30));
}
