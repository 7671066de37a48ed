using System.Text.Json.Serialization;
using NodaTime;
using UnitVent.Charting.Fields;

namespace UnitVent.Charting.Entries;

/// <summary>The ventilator's settings from an instant on: a whole snapshot of the mode's members, never a difference.</summary>
/// <remarks>
/// Limits: common practice. P high, P low and PEEP are relative to atmosphere; the inspiratory pressure of pressure control is above PEEP
/// and says so in its name (the ambiguity is a published hazard: Respir Care 2010;55:1705).
/// </remarks>
public sealed record SettingChange : Entry
{
    /// <inheritdoc/>
    [JsonIgnore]
    public override EntryKind Kind => EntryKind.SettingChange;

    /// <summary>Gets from when the settings were in force.</summary>
    [Field("Time of change", Required = true)]
    [JsonPropertyName("effectiveAt")]
    public Instant? ChangedAt { get; init; }

    /// <summary>Gets the mode.</summary>
    [Field("Mode", Required = true)]
    public VentilationMode? Mode { get; init; }

    /// <summary>Gets the mode in words, when it is another.</summary>
    [Field("Mode in words", MaxLength = 60)]
    public string? ModeText { get; init; }

    /// <summary>Gets the inspired oxygen fraction, 0.21–1.00.</summary>
    [Number("FiO2", 0.21, 1.0, Decimals = 2, AskAbove = 0.8, Required = true)]
    public decimal? FiO2 { get; init; }

    /// <summary>Gets P high, relative to atmosphere.</summary>
    [Number("P high", 5, 50, Unit = "cmH2O", AskBelow = 12, AskAbove = 32)]
    public decimal? PHighCmH2O { get; init; }

    /// <summary>Gets P low, relative to atmosphere; 0 is a choice.</summary>
    [Number("P low", 0, 20, Unit = "cmH2O", AskAbove = 5)]
    public decimal? PLowCmH2O { get; init; }

    /// <summary>Gets T high.</summary>
    [Number("T high", 0.5, 30, Unit = "s", Decimals = 1, AskBelow = 3, AskAbove = 12)]
    public decimal? THighS { get; init; }

    /// <summary>Gets T low.</summary>
    [Number("T low", 0.1, 5.0, Unit = "s", Decimals = 2, AskBelow = 0.3, AskAbove = 0.9)]
    public decimal? TLowS { get; init; }

    /// <summary>Gets what ends the release.</summary>
    [Field("Release ended by")]
    public ReleaseEnd? ReleaseEndedBy { get; init; }

    /// <summary>Gets the pressure support above its reference.</summary>
    [Number("Pressure support", 0, 40, Unit = "cmH2O", AskAbove = 20)]
    public decimal? PressureSupportCmH2O { get; init; }

    /// <summary>Gets what the pressure support is added to.</summary>
    [Field("Support above")]
    public PressureReference? PressureSupportReference { get; init; }

    /// <summary>Gets whether tube compensation is on.</summary>
    [Field("Tube compensation")]
    public TubeCompensation? TubeCompensation { get; init; }

    /// <summary>Gets the share of the tube's resistance made up for.</summary>
    [Number("Tube compensation", 0, 100, Unit = "%")]
    public decimal? TubeCompensationPercent { get; init; }

    /// <summary>Gets the set rate.</summary>
    [Number("Set rate", 0, 60, Unit = "/min", AskAbove = 35)]
    public decimal? SetRatePerMin { get; init; }

    /// <summary>Gets the set tidal volume.</summary>
    [Number("Set tidal volume", 50, 1500, Unit = "mL")]
    public decimal? TidalVolumeMl { get; init; }

    /// <summary>Gets the inspiratory pressure above PEEP.</summary>
    [Number("Inspiratory pressure above PEEP", 0, 60, Unit = "cmH2O", AskAbove = 30)]
    public decimal? InspiratoryPressureAbovePeepCmH2O { get; init; }

    /// <summary>Gets the inspiratory time.</summary>
    [Number("Inspiratory time", 0.2, 5, Unit = "s", Decimals = 1)]
    public decimal? InspiratoryTimeS { get; init; }

    /// <summary>Gets the inspiratory pause.</summary>
    [Number("Pause", 0, 2, Unit = "s", Decimals = 1)]
    public decimal? PauseTimeS { get; init; }

    /// <summary>Gets PEEP, relative to atmosphere.</summary>
    [Number("PEEP", 0, 30, Unit = "cmH2O", AskAbove = 18)]
    public decimal? PeepCmH2O { get; init; }

    /// <summary>Gets the pressure rise time.</summary>
    [Number("Rise time", 0, 2, Unit = "s", Decimals = 2)]
    public decimal? RiseTimeS { get; init; }

    /// <summary>Gets the phase that goes with the change.</summary>
    [Field("Phase")]
    public CoursePhase? Phase { get; init; }

    /// <summary>Gets why it was changed.</summary>
    [Field("Reason", MaxLength = 400)]
    public string? Reason { get; init; }

    /// <inheritdoc/>
    public override Instant? EffectiveAt() => ChangedAt;

    /// <inheritdoc/>
    public override Entry EffectiveFrom(Instant at) => this with { ChangedAt = at };
}
