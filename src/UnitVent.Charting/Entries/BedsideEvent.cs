using System.Text.Json.Serialization;
using NodaTime;
using UnitVent.Charting.Fields;

namespace UnitVent.Charting.Entries;

/// <summary>Something that happened, from a list.</summary>
public sealed record BedsideEvent : Entry
{
    /// <inheritdoc/>
    [JsonIgnore]
    public override EntryKind Kind => EntryKind.Event;

    /// <summary>Gets when it happened.</summary>
    [Field("Time", Required = true)]
    public Instant? At { get; init; }

    /// <summary>Gets what happened.</summary>
    [Field("What", Required = true)]
    [JsonPropertyName("kind")]
    public EventKind? What { get; init; }

    /// <summary>Gets when it ended.</summary>
    [Field("Until")]
    public Instant? Until { get; init; }

    /// <summary>Gets the result of a trial.</summary>
    [Field("Result")]
    public TrialResult? Result { get; init; }

    /// <summary>Gets more in words.</summary>
    [Field("Detail", MaxLength = 400)]
    public string? Detail { get; init; }

    /// <inheritdoc/>
    public override Instant? EffectiveAt() => At;

    /// <inheritdoc/>
    public override Entry EffectiveFrom(Instant at) => this with { At = at };
}
