using System.Text.Json.Serialization;
using NodaTime;
using UnitVent.Charting.Fields;

namespace UnitVent.Charting.Entries;

/// <summary>What the ventilator shows.</summary>
/// <remarks>Limits: common practice.</remarks>
public sealed record VentilatorCheck : Entry
{
    /// <inheritdoc/>
    [JsonIgnore]
    public override EntryKind Kind => EntryKind.VentilatorCheck;

    /// <summary>Gets when it was seen.</summary>
    [Field("Observed", Required = true)]
    public Instant? ObservedAt { get; init; }

    /// <summary>Gets whether the settings in force were seen to be unchanged.</summary>
    [Field("Settings seen, unchanged")]
    public bool? SettingsConfirmed { get; init; }

    /// <summary>Gets the peak airway pressure.</summary>
    [Number("Peak pressure", 5, 120, Unit = "cmH2O", AskAbove = 45)]
    public decimal? PeakPressureCmH2O { get; init; }

    /// <summary>Gets the mean airway pressure as measured.</summary>
    [Number("Mean airway pressure", 2, 60, Unit = "cmH2O", Decimals = 1, AskAbove = 35)]
    public decimal? MeanAirwayPressureCmH2O { get; init; }

    /// <summary>Gets the plateau pressure.</summary>
    [Number("Plateau", 5, 80, Unit = "cmH2O", AskAbove = 32)]
    public decimal? PlateauPressureCmH2O { get; init; }

    /// <summary>Gets how long the hold lasted.</summary>
    [Number("Hold", 0.1, 10, Unit = "s", Decimals = 1)]
    public decimal? HoldS { get; init; }

    /// <summary>Gets whether the patient was passive during the hold.</summary>
    [Field("Passive during the hold")]
    public bool? Passive { get; init; }

    /// <summary>Gets auto-PEEP.</summary>
    [Number("Auto-PEEP", 0, 40, Unit = "cmH2O", Decimals = 1, AskAbove = 8)]
    public decimal? AutoPeepCmH2O { get; init; }

    /// <summary>Gets the total minute volume.</summary>
    [Number("Total minute volume", 0.5, 40, Unit = "L/min", Decimals = 1, AskBelow = 4, AskAbove = 16)]
    public decimal? TotalMinuteVolumeLMin { get; init; }

    /// <summary>Gets the patient's own minute volume as the ventilator splits it.</summary>
    [Number("Own minute volume", 0, 40, Unit = "L/min", Decimals = 1)]
    public decimal? SpontaneousMinuteVolumeLMin { get; init; }

    /// <summary>Gets the total rate.</summary>
    [Number("Total rate", 0, 100, Unit = "/min", AskAbove = 40)]
    public decimal? TotalRatePerMin { get; init; }

    /// <summary>Gets the patient's own rate.</summary>
    [Number("Own rate", 0, 80, Unit = "/min", AskAbove = 35)]
    public decimal? SpontaneousRatePerMin { get; init; }

    /// <summary>Gets the release rate as measured.</summary>
    [Number("Release rate", 0, 60, Unit = "/min", Decimals = 1, AskAbove = 35)]
    public decimal? ReleaseRatePerMin { get; init; }

    /// <summary>Gets the exhaled volume of a release.</summary>
    [Number("Release volume", 20, 2500, Unit = "mL")]
    public decimal? ReleaseVolumeMl { get; init; }

    /// <summary>Gets how many releases the volume is the mean of.</summary>
    [Number("Releases averaged", 1, 60)]
    public int? ReleasesAveraged { get; init; }

    /// <summary>Gets the exhaled tidal volume.</summary>
    [Number("Tidal volume", 20, 2500, Unit = "mL")]
    public decimal? TidalVolumeMl { get; init; }

    /// <summary>Gets the volume of the patient's own breaths.</summary>
    [Number("Own tidal volume", 10, 2000, Unit = "mL")]
    public decimal? SpontaneousTidalVolumeMl { get; init; }

    /// <summary>Gets the peak expiratory flow of a release.</summary>
    [Number("Peak expiratory flow", 5, 200, Unit = "L/min", AskAbove = 120)]
    public decimal? PeakExpiratoryFlowLMin { get; init; }

    /// <summary>Gets the expiratory flow at the end of the release; 0 is a reading.</summary>
    [Number("End-release flow", 0, 200, Unit = "L/min")]
    public decimal? EndReleaseFlowLMin { get; init; }

    /// <summary>Gets how many releases the flows are the mean of.</summary>
    [Number("Flow readings", 1, 20)]
    public int? FlowReadings { get; init; }

    /// <summary>Gets whether the patient breathed during the release.</summary>
    [Field("Effort during the release")]
    public bool? EffortDuringRelease { get; init; }

    /// <summary>Gets whether the flow curve could not be read.</summary>
    [Field("Flow curve not readable")]
    public bool? CurveNotReadable { get; init; }

    /// <summary>Gets the leak.</summary>
    [Number("Leak", 0, 100, Unit = "%", AskAbove = 30)]
    public decimal? LeakPercent { get; init; }

    /// <summary>Gets end-tidal carbon dioxide.</summary>
    [Number("EtCO2", 5, 150, Unit = "mmHg", AskAbove = 70)]
    public decimal? EtCO2MmHg { get; init; }

    /// <summary>Gets the pulse oximeter's reading.</summary>
    [Number("SpO2", 40, 100, Unit = "%", AskBelow = 80)]
    public decimal? SpO2Percent { get; init; }

    /// <summary>Gets mean arterial pressure.</summary>
    [Number("Mean arterial pressure", 20, 200, Unit = "mmHg", AskBelow = 55)]
    public decimal? MeanArterialPressureMmHg { get; init; }

    /// <summary>Gets whether a vasopressor runs, and which way.</summary>
    [Field("Vasopressor")]
    public Vasopressor? Vasopressor { get; init; }

    /// <summary>Gets whether the alarms were checked.</summary>
    [Field("Alarms checked")]
    public bool? AlarmsChecked { get; init; }

    /// <inheritdoc/>
    public override Instant? EffectiveAt() => ObservedAt;

    /// <inheritdoc/>
    public override Entry EffectiveFrom(Instant at) => this with { ObservedAt = at };
}
