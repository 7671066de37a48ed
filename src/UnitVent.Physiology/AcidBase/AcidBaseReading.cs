namespace UnitVent.Physiology;

/// <summary>How a gas reads as acid and base.</summary>
/// <param name="Pattern">What the three numbers look like.</param>
/// <param name="Expected">For one of the four single disturbances, where the other side is expected: PCO2 in mmHg in a metabolic one,
/// bicarbonate in mmol/L in a respiratory one. Null for every other pattern.</param>
/// <param name="Finding">Where the other side lies; null exactly when <paramref name="Expected"/> is.</param>
public readonly record struct AcidBaseReading(AcidBasePattern Pattern, ExpectedRange? Expected, CompensationFinding? Finding);
