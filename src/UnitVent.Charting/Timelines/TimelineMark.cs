using NodaTime;

namespace UnitVent.Charting.Timelines;

/// <summary>Something that happened, marked on every lane.</summary>
/// <param name="At">When.</param>
/// <param name="Kind">What kind of mark: settingChange, event, note.</param>
/// <param name="Text">What it was, in words.</param>
/// <param name="Entry">The entry behind it.</param>
public sealed record TimelineMark(Instant At, string Kind, string Text, Guid Entry);
