using UnitVent.Charting.Entries;

namespace UnitVent.Store.Reading;

/// <summary>One page of entries.</summary>
/// <param name="Items">The entries, newest first.</param>
/// <param name="Next">The cursor of the next page; null when this is the last.</param>
public sealed record EntryPage(IReadOnlyList<ChartEntry> Items, string? Next);
