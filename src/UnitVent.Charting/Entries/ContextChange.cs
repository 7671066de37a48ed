using System.Text.Json.Serialization;
using NodaTime;
using UnitVent.Charting.Fields;

namespace UnitVent.Charting.Entries;

/// <summary>A circumstance that changes how values are read, from a time until a time.</summary>
public sealed record ContextChange : Entry
{
    /// <inheritdoc/>
    [JsonIgnore]
    public override EntryKind Kind => EntryKind.Context;

    /// <summary>Gets the circumstance.</summary>
    [Field("Circumstance", Required = true)]
    public Circumstance? Flag { get; init; }

    /// <summary>Gets from when.</summary>
    [Field("From", Required = true)]
    public Instant? From { get; init; }

    /// <summary>Gets until when; null while it lasts.</summary>
    [Field("Until")]
    public Instant? Until { get; init; }

    /// <summary>Gets why.</summary>
    [Field("Reason", MaxLength = 400)]
    public string? Reason { get; init; }

    /// <inheritdoc/>
    public override Instant? EffectiveAt() => From;

    /// <inheritdoc/>
    public override Entry EffectiveFrom(Instant at) => this with { From = at };
}
