using NodaTime;

namespace UnitVent.Charting.Entries;

/// <summary>A standing entry together with its body in its own type.</summary>
/// <typeparam name="T">The kind of entry.</typeparam>
/// <param name="Entry">The entry.</param>
/// <param name="Body">What was charted.</param>
public readonly record struct Charted<T>(ChartEntry Entry, T Body)
    where T : Entry
{
    /// <summary>Gets when it was so at the bedside.</summary>
    public Instant At => Entry.EffectiveAt;

    /// <summary>Gets the entry's id.</summary>
    public Guid Id => Entry.Id;
}
