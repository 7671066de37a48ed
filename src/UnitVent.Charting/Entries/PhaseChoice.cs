using System.Text.Json.Serialization;
using NodaTime;
using UnitVent.Charting.Fields;

namespace UnitVent.Charting.Entries;

/// <summary>The phase that a person chose.</summary>
public sealed record PhaseChoice : Entry
{
    /// <inheritdoc/>
    [JsonIgnore]
    public override EntryKind Kind => EntryKind.Phase;

    /// <summary>Gets the phase.</summary>
    [Field("Phase", Required = true)]
    public CoursePhase? Phase { get; init; }

    /// <summary>Gets from when.</summary>
    [Field("From", Required = true)]
    public Instant? From { get; init; }

    /// <summary>Gets why.</summary>
    [Field("Reason", MaxLength = 400)]
    public string? Reason { get; init; }

    /// <inheritdoc/>
    public override Instant? EffectiveAt() => From;

    /// <inheritdoc/>
    public override Entry EffectiveFrom(Instant at) => this with { From = at };
}
