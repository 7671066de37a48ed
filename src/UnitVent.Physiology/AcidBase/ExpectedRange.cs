namespace UnitVent.Physiology;

/// <summary>Where a value is expected, in the unit its equation names.</summary>
/// <param name="Lowest">The lowest expected value, itself expected.</param>
/// <param name="Highest">The highest expected value, itself expected.</param>
public readonly record struct ExpectedRange(double Lowest, double Highest);
