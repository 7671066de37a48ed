using NodaTime;

namespace UnitVent.Charting.Timelines;

/// <summary>One point of a line.</summary>
/// <param name="At">When.</param>
/// <param name="Value">The value, unrounded; null where a gap begins.</param>
/// <param name="Entry">The entry behind it.</param>
public sealed record TimelinePoint(Instant At, double? Value, Guid? Entry);
