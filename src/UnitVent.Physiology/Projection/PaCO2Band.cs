namespace UnitVent.Physiology;

/// <summary>The PaCO2 a setting change leads to, and how far the answer moves with what is not known.</summary>
/// <param name="Expected">With the dead space as given.</param>
/// <param name="Lowest">The lowest of the values with 0.7, 1 and 1.3 times the dead space.</param>
/// <param name="Highest">The highest of the same values.</param>
/// <param name="WithoutOwnBreaths">If the own breaths that helped to reach the present PaCO2 stopped at the same time;
/// null when that alone would be refused as too large a change.</param>
public sealed record PaCO2Band(PartialPressure Expected, PartialPressure Lowest, PartialPressure Highest, PartialPressure? WithoutOwnBreaths);
