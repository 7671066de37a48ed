using System.Text.Json.Serialization;
using NodaTime;
using UnitVent.Charting.Fields;

namespace UnitVent.Charting.Entries;

/// <summary>A blood gas as the slip prints it, at 37 °C unless it says otherwise.</summary>
/// <remarks>Limits: common practice; the tensions' limits are in mmHg.</remarks>
public sealed record BloodGas : Entry
{
    /// <inheritdoc/>
    [JsonIgnore]
    public override EntryKind Kind => EntryKind.BloodGas;

    /// <summary>Gets when the sample was drawn.</summary>
    [Field("Drawn", Required = true)]
    public Instant? DrawnAt { get; init; }

    /// <summary>Gets where the blood came from; there is no default.</summary>
    [Field("Specimen", Required = true)]
    public Specimen? Specimen { get; init; }

    /// <summary>Gets the site.</summary>
    [Field("Site", MaxLength = 60)]
    public string? Site { get; init; }

    /// <summary>Gets the oxygen fraction keyed in at the analyser.</summary>
    [Number("FiO2 on the slip", 0.21, 1.0, Decimals = 2)]
    public decimal? FiO2 { get; init; }

    /// <summary>Gets the temperature keyed in at the analyser.</summary>
    [Number("Temperature keyed in", 25, 43, Unit = "°C", Decimals = 1, AskBelow = 33, AskAbove = 40)]
    public decimal? TemperatureC { get; init; }

    /// <summary>Gets whether the values are corrected to that temperature.</summary>
    [Field("Corrected for temperature")]
    public bool? TemperatureCorrected { get; init; }

    /// <summary>Gets the unit of the tensions.</summary>
    [Field("Tensions in", Required = true)]
    public TensionUnit? TensionUnit { get; init; }

    /// <summary>Gets pH.</summary>
    [Number("pH", 6.5, 8.0, Decimals = 2, AskBelow = 7.0, AskAbove = 7.7, Required = true)]
    [JsonPropertyName("pH")]
    public decimal? PH { get; init; }

    /// <summary>Gets the carbon dioxide tension, in the unit of the slip.</summary>
    [Number("pCO2", 5, 250, AskBelow = 20, AskAbove = 100, Required = true, IsTension = true)]
    [JsonPropertyName("pCO2")]
    public decimal? PCO2 { get; init; }

    /// <summary>Gets the oxygen tension, in the unit of the slip.</summary>
    [Number("pO2", 10, 700, AskBelow = 45, AskAbove = 300, IsTension = true)]
    public decimal? PO2 { get; init; }

    /// <summary>Gets the measured oxygen saturation.</summary>
    [Number("sO2", 20, 100, Unit = "%", Decimals = 1, AskBelow = 80)]
    public decimal? SO2Percent { get; init; }

    /// <summary>Gets haemoglobin.</summary>
    [Number("Haemoglobin", 2, 25, Unit = "g/dL", Decimals = 1)]
    public decimal? HaemoglobinGDl { get; init; }

    /// <summary>Gets carboxyhaemoglobin.</summary>
    [Number("COHb", 0, 60, Unit = "%", Decimals = 1, AskAbove = 10)]
    public decimal? CarboxyHbPercent { get; init; }

    /// <summary>Gets methaemoglobin.</summary>
    [Number("MetHb", 0, 60, Unit = "%", Decimals = 1, AskAbove = 5)]
    public decimal? MetHbPercent { get; init; }

    /// <summary>Gets lactate.</summary>
    [Number("Lactate", 0, 30, Unit = "mmol/L", Decimals = 1, AskAbove = 10)]
    public decimal? LactateMmolL { get; init; }

    /// <summary>Gets bicarbonate as printed.</summary>
    [Number("Bicarbonate", 1, 70, Unit = "mmol/L", Decimals = 1, AskBelow = 12, AskAbove = 40)]
    public decimal? BicarbonateMmolL { get; init; }

    /// <summary>Gets which bicarbonate the slip prints.</summary>
    [Field("Which bicarbonate")]
    public BicarbonateKind? BicarbonateKind { get; init; }

    /// <summary>Gets base excess as printed.</summary>
    [Number("Base excess", -40, 40, Unit = "mmol/L", Decimals = 1, AskBelow = -15, AskAbove = 15)]
    public decimal? BaseExcessMmolL { get; init; }

    /// <summary>Gets sodium.</summary>
    [Number("Sodium", 100, 190, Unit = "mmol/L", AskBelow = 120, AskAbove = 160)]
    public decimal? SodiumMmolL { get; init; }

    /// <summary>Gets chloride.</summary>
    [Number("Chloride", 60, 150, Unit = "mmol/L", AskBelow = 80, AskAbove = 125)]
    public decimal? ChlorideMmolL { get; init; }

    /// <summary>Gets albumin.</summary>
    [Number("Albumin", 5, 70, Unit = "g/L")]
    public decimal? AlbuminGL { get; init; }

    /// <summary>Gets the pulse oximeter's reading at the draw.</summary>
    [Number("SpO2 at the draw", 40, 100, Unit = "%", AskBelow = 80)]
    public decimal? SpO2Percent { get; init; }

    /// <summary>Gets end-tidal carbon dioxide at the draw.</summary>
    [Number("EtCO2 at the draw", 5, 150, Unit = "mmHg", AskAbove = 70)]
    public decimal? EtCO2MmHg { get; init; }

    /// <summary>Gets whether it was drawn before or after a setting change close to it.</summary>
    [Field("Before or after the change")]
    public RelativeToChange? RelativeToChange { get; init; }

    /// <summary>Gets the sample number.</summary>
    [Field("Sample number", MaxLength = 40)]
    public string? SampleNumber { get; init; }

    /// <inheritdoc/>
    public override Instant? EffectiveAt() => DrawnAt;

    /// <inheritdoc/>
    public override Entry EffectiveFrom(Instant at) => this with { DrawnAt = at };
}
