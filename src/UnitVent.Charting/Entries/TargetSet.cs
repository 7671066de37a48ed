using System.Text.Json.Serialization;
using NodaTime;
using UnitVent.Charting.Fields;

namespace UnitVent.Charting.Entries;

/// <summary>What the team aims at for this patient. A later set replaces the earlier one whole.</summary>
/// <remarks>Limits: common practice.</remarks>
public sealed record TargetSet : Entry
{
    /// <inheritdoc/>
    [JsonIgnore]
    public override EntryKind Kind => EntryKind.Target;

    /// <summary>Gets from when.</summary>
    [Field("From", Required = true)]
    public Instant? From { get; init; }

    /// <summary>Gets when it expires.</summary>
    [Field("Expires")]
    public Instant? ExpiresAt { get; init; }

    /// <summary>Gets why.</summary>
    [Field("Reason", Required = true, MaxLength = 400)]
    public string? Reason { get; init; }

    /// <summary>Gets the lower edge of SpO2.</summary>
    [Number("SpO2 from", 50, 100, Unit = "%")]
    public decimal? SpO2LowPercent { get; init; }

    /// <summary>Gets the upper edge of SpO2.</summary>
    [Number("SpO2 to", 50, 100, Unit = "%")]
    public decimal? SpO2HighPercent { get; init; }

    /// <summary>Gets the lower edge of PaO2.</summary>
    [Number("PaO2 from", 30, 300, Unit = "mmHg")]
    public decimal? PaO2LowMmHg { get; init; }

    /// <summary>Gets the upper edge of PaO2.</summary>
    [Number("PaO2 to", 30, 300, Unit = "mmHg")]
    public decimal? PaO2HighMmHg { get; init; }

    /// <summary>Gets the lower edge of PaCO2.</summary>
    [Number("PaCO2 from", 15, 150, Unit = "mmHg")]
    public decimal? PaCO2LowMmHg { get; init; }

    /// <summary>Gets the upper edge of PaCO2.</summary>
    [Number("PaCO2 to", 15, 150, Unit = "mmHg")]
    public decimal? PaCO2HighMmHg { get; init; }

    /// <summary>Gets the lowest pH accepted.</summary>
    [Number("pH not below", 7.0, 7.45, Decimals = 2)]
    [JsonPropertyName("pHFloor")]
    public decimal? PHFloor { get; init; }

    /// <summary>Gets the highest P high accepted.</summary>
    [Number("P high not above", 10, 50, Unit = "cmH2O")]
    public decimal? PHighLimitCmH2O { get; init; }

    /// <summary>Gets the end-release flow aimed at, % of the peak flow.</summary>
    [Number("End of release at", 10, 95, Unit = "% of peak")]
    public decimal? EndReleaseFlowPercent { get; init; }

    /// <summary>Gets the lower edge of RASS.</summary>
    [Number("RASS from", -5, 4)]
    public int? RassLow { get; init; }

    /// <summary>Gets the upper edge of RASS.</summary>
    [Number("RASS to", -5, 4)]
    public int? RassHigh { get; init; }

    /// <summary>Gets the mean arterial pressure aimed at.</summary>
    [Number("Mean arterial pressure", 40, 120, Unit = "mmHg")]
    public decimal? MeanArterialPressureMmHg { get; init; }

    /// <inheritdoc/>
    public override Instant? EffectiveAt() => From;

    /// <inheritdoc/>
    public override Entry EffectiveFrom(Instant at) => this with { From = at };
}
