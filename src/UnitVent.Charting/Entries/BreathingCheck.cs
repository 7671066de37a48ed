using System.Text.Json.Serialization;
using NodaTime;
using UnitVent.Charting.Fields;

namespace UnitVent.Charting.Entries;

/// <summary>How the patient breathes, as seen at the bedside.</summary>
/// <remarks>Limits: common practice.</remarks>
public sealed record BreathingCheck : Entry
{
    /// <inheritdoc/>
    [JsonIgnore]
    public override EntryKind Kind => EntryKind.BreathingCheck;

    /// <summary>Gets when it was seen.</summary>
    [Field("Observed", Required = true)]
    public Instant? ObservedAt { get; init; }

    /// <summary>Gets the Richmond agitation–sedation score, −5…4.</summary>
    [Number("RASS", -5, 4, AskBelow = -4)]
    public int? Rass { get; init; }

    /// <summary>Gets whether the score could not be assessed.</summary>
    [Field("RASS not assessable")]
    public bool? RassNotAssessable { get; init; }

    /// <summary>Gets how hard the patient works.</summary>
    [Field("Effort")]
    public Effort? Effort { get; init; }

    /// <summary>Gets whether accessory muscles are used.</summary>
    [Field("Accessory muscles")]
    public bool? AccessoryMuscles { get; init; }

    /// <summary>Gets how the patient looks.</summary>
    [Field("Comfort")]
    public Comfort? Comfort { get; init; }

    /// <summary>Gets whether a relaxant acts.</summary>
    [Field("Relaxant")]
    public Relaxant? Relaxant { get; init; }

    /// <summary>Gets how strong the cough is.</summary>
    [Field("Cough")]
    public Cough? Cough { get; init; }

    /// <summary>Gets how much is suctioned.</summary>
    [Field("Secretions")]
    public Secretions? Secretions { get; init; }

    /// <summary>Gets the patient's own rate, counted.</summary>
    [Number("Own rate", 0, 80, Unit = "/min", AskAbove = 35)]
    public decimal? SpontaneousRatePerMin { get; init; }

    /// <summary>Gets the volume of the patient's own breaths.</summary>
    [Number("Own tidal volume", 10, 2000, Unit = "mL")]
    public decimal? SpontaneousTidalVolumeMl { get; init; }

    /// <summary>Gets the pulse oximeter's reading.</summary>
    [Number("SpO2", 40, 100, Unit = "%", AskBelow = 80)]
    public decimal? SpO2Percent { get; init; }

    /// <inheritdoc/>
    public override Instant? EffectiveAt() => ObservedAt;

    /// <inheritdoc/>
    public override Entry EffectiveFrom(Instant at) => this with { ObservedAt = at };
}
