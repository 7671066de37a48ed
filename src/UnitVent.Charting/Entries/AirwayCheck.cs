using System.Text.Json.Serialization;
using NodaTime;
using UnitVent.Charting.Fields;

namespace UnitVent.Charting.Entries;

/// <summary>Tube, cuff and humidifier.</summary>
/// <remarks>Limits: common practice.</remarks>
public sealed record AirwayCheck : Entry
{
    /// <inheritdoc/>
    [JsonIgnore]
    public override EntryKind Kind => EntryKind.AirwayCheck;

    /// <summary>Gets when it was seen.</summary>
    [Field("Observed", Required = true)]
    public Instant? ObservedAt { get; init; }

    /// <summary>Gets which airway.</summary>
    [Field("Airway")]
    public AirwayKind? Airway { get; init; }

    /// <summary>Gets the inner diameter.</summary>
    [Number("Size", 4, 11, Unit = "mm", Decimals = 1)]
    public decimal? SizeMm { get; init; }

    /// <summary>Gets the depth at the teeth, nostril or flange.</summary>
    [Number("Depth", 10, 35, Unit = "cm", AskBelow = 18, AskAbove = 28)]
    public decimal? DepthCm { get; init; }

    /// <summary>Gets the cuff pressure.</summary>
    [Number("Cuff pressure", 0, 120, Unit = "cmH2O", AskBelow = 20, AskAbove = 30)]
    public decimal? CuffPressureCmH2O { get; init; }

    /// <summary>Gets whether the skin is intact.</summary>
    [Field("Skin intact")]
    public bool? SkinIntact { get; init; }

    /// <summary>Gets the humidifier.</summary>
    [Field("Humidifier")]
    public Humidifier? Humidifier { get; init; }

    /// <summary>Gets where or when the tube was fixed, in words.</summary>
    [Field("Tube fixed at", MaxLength = 60)]
    public string? TubeFixedAt { get; init; }

    /// <inheritdoc/>
    public override Instant? EffectiveAt() => ObservedAt;

    /// <inheritdoc/>
    public override Entry EffectiveFrom(Instant at) => this with { ObservedAt = at };
}
