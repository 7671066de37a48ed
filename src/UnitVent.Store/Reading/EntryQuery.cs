using NodaTime;
using UnitVent.Charting.Entries;

namespace UnitVent.Store.Reading;

/// <summary>Which entries to read, newest first, struck and replaced ones included.</summary>
/// <param name="From">Not effective before; null for no limit.</param>
/// <param name="To">Not effective after; null for no limit.</param>
/// <param name="Kind">Of one kind; null for all.</param>
/// <param name="After">The cursor of the page before.</param>
/// <param name="Limit">At most this many, 1–500.</param>
public sealed record EntryQuery(Instant? From = null, Instant? To = null, EntryKind? Kind = null, string? After = null, int Limit = 100);
