using System.Text.Json.Serialization;
using NodaTime;
using UnitVent.Charting.Fields;

namespace UnitVent.Charting.Entries;

/// <summary>The method that a person chose for this patient.</summary>
public sealed record MethodChoice : Entry
{
    /// <inheritdoc/>
    [JsonIgnore]
    public override EntryKind Kind => EntryKind.Method;

    /// <summary>Gets the method.</summary>
    [Field("Method", Required = true)]
    public SettingMethod? Method { get; init; }

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
