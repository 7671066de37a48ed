using NodaTime;

namespace UnitVent.Charting.Trends;

/// <summary>One value of a series.</summary>
/// <param name="At">When it was so.</param>
/// <param name="Value">The value.</param>
/// <param name="Entry">The entry behind it; null when there is none.</param>
public readonly record struct SeriesPoint(Instant At, double Value, Guid? Entry = null);
