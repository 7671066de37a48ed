namespace UnitVent.Charting.Rules;

/// <summary>The unit's thresholds. Each has a default with its source; values without a printed source are common practice.</summary>
public sealed record RuleThresholds;
