namespace UnitVent.Physiology;

/// <summary>The volume a respiratory system takes for each unit of pressure.</summary>
/// <remarks>Held in mL/cmH2O. The default value is 0 mL/cmH2O, which no factory produces; equations refuse it.</remarks>
public readonly record struct Compliance
{
    private Compliance(double mlPerCmH2O) => MlPerCmH2O = mlPerCmH2O;

    /// <summary>Gets the value in mL/cmH2O, in (0, 500].</summary>
    public double MlPerCmH2O { get; }

    /// <summary>Creates a value from mL/cmH2O.</summary>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="mlPerCmH2O"/> is NaN or outside (0, 500].</exception>
    public static Compliance FromMlPerCmH2O(double mlPerCmH2O) => new(Guard.InRange(mlPerCmH2O, Guard.JustAboveZero, 500));
}
