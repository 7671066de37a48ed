using System.Text.Json.Serialization;
using NodaTime;
using UnitVent.Charting.Fields;

namespace UnitVent.Charting.Entries;

/// <summary>A note.</summary>
public sealed record Note : Entry
{
    /// <inheritdoc/>
    [JsonIgnore]
    public override EntryKind Kind => EntryKind.Note;

    /// <summary>Gets the time it speaks of.</summary>
    [Field("Time", Required = true)]
    public Instant? At { get; init; }

    /// <summary>Gets the text.</summary>
    [Field("Note", Required = true, MaxLength = 4000)]
    public string? Text { get; init; }

    /// <inheritdoc/>
    public override Instant? EffectiveAt() => At;

    /// <inheritdoc/>
    public override Entry EffectiveFrom(Instant at) => this with { At = at };
}
