using System.Text.Json.Serialization;
using NodaTime;
using UnitVent.Charting.Fields;

namespace UnitVent.Charting.Entries;

/// <summary>Something to be done by a time.</summary>
public sealed record FollowUp : Entry
{
    /// <inheritdoc/>
    [JsonIgnore]
    public override EntryKind Kind => EntryKind.FollowUp;

    /// <summary>Gets what is to be done.</summary>
    [Field("What", Required = true, MaxLength = 200)]
    public string? What { get; init; }

    /// <summary>Gets by when.</summary>
    [Field("Due", Required = true)]
    public Instant? DueAt { get; init; }

    /// <summary>Gets the role that is to do it.</summary>
    [Field("For", MaxLength = 40)]
    public string? ForRole { get; init; }

    /// <inheritdoc/>
    public override Instant? EffectiveAt() => null;

    /// <inheritdoc/>
    public override Entry EffectiveFrom(Instant at) => this;
}
