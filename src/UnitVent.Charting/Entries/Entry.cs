using System.Text.Json.Serialization;
using NodaTime;

namespace UnitVent.Charting.Entries;

/// <summary>What a person or a machine charted about one patient. Immutable: a correction is another entry.</summary>
/// <remarks>Numbers are kept as typed, with their trailing zeros and in the unit in which they were typed. A member that was not recorded is null, never zero.</remarks>
public abstract record Entry
{
    /// <summary>Gets the kind of entry.</summary>
    [JsonIgnore]
    public abstract EntryKind Kind { get; }

    /// <summary>When it was so at the bedside; null for entries that are true from the moment at which they are recorded.</summary>
    public abstract Instant? EffectiveAt();

    /// <summary>The same entry, effective at another instant.</summary>
    public abstract Entry EffectiveFrom(Instant at);
}
