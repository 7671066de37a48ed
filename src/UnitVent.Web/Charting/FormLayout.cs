using UnitVent.Charting.Checking;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Fields;

namespace UnitVent.Web.Charting;

/// <summary>The order and grouping of the fields of a form: as they are read from the slip, the screen of the ventilator, the patient.</summary>
public static class FormLayout
{
    private static readonly string[] ReleaseOnly =
        ["releaseRatePerMin", "releaseVolumeMl", "releasesAveraged", "peakExpiratoryFlowLMin", "endReleaseFlowLMin", "flowReadings", "effortDuringRelease", "curveNotReadable"];

    private static readonly string[] ConventionalOnly = ["plateauPressureCmH2O", "holdS", "passive", "autoPeepCmH2O", "tidalVolumeMl"];

    private static readonly FormGroup[] Gas =
    [
        new("Sample", ["drawnAt", "specimen", "site", "fiO2", "temperatureC", "temperatureCorrected"]),
        new("Gas", ["pH", "pCO2", "pO2", "tensionUnit"]),
        new("Oximetry and metabolic", ["sO2Percent", "haemoglobinGDl", "carboxyHbPercent", "metHbPercent", "lactateMmolL", "bicarbonateMmolL", "bicarbonateKind", "baseExcessMmolL"]),
        new("From the monitor", ["spO2Percent", "etCO2MmHg"]),
        new("Around the draw", ["relativeToChange", "sampleNumber"]),
        new("Electrolytes and albumin", ["sodiumMmolL", "chlorideMmolL", "albuminGL"], Folded: true),
    ];

    private static readonly FormGroup[] Check =
    [
        new("", ["observedAt", "settingsConfirmed"]),
        new("Pressures", ["peakPressureCmH2O", "meanAirwayPressureCmH2O", "plateauPressureCmH2O", "holdS", "passive", "autoPeepCmH2O"]),
        new("Minute volume and rate", ["totalMinuteVolumeLMin", "spontaneousMinuteVolumeLMin", "totalRatePerMin", "spontaneousRatePerMin", "releaseRatePerMin"]),
        new("Volumes", ["releaseVolumeMl", "releasesAveraged", "tidalVolumeMl", "spontaneousTidalVolumeMl"]),
        new("Frozen flow curve", ["peakExpiratoryFlowLMin", "endReleaseFlowLMin", "flowReadings", "effortDuringRelease", "curveNotReadable"]),
        new("Monitor and circulation", ["spO2Percent", "etCO2MmHg", "meanArterialPressureMmHg", "vasopressor"]),
        new("Circuit", ["leakPercent", "alarmsChecked"]),
    ];

    private static readonly FormGroup[] Breathing =
    [
        new("", ["observedAt"]),
        new("The patient", ["effort", "accessoryMuscles", "comfort", "rass", "rassNotAssessable", "relaxant"]),
        new("Cough and secretions", ["cough", "secretions"]),
        new("Counted", ["spontaneousRatePerMin", "spontaneousTidalVolumeMl", "spO2Percent"]),
    ];

    /// <summary>The groups of a kind of entry in a mode; null for no mode yet.</summary>
    public static IReadOnlyList<FormGroup> Of(EntryKind kind, VentilationMode? mode) => kind switch
    {
        EntryKind.SettingChange => Settings(mode),
        EntryKind.BloodGas => Gas,
        EntryKind.VentilatorCheck => ForMode(Check, mode),
        EntryKind.BreathingCheck => Breathing,
        EntryKind.AirwayCheck or EntryKind.Event or EntryKind.Context or EntryKind.Target or EntryKind.Phase or EntryKind.Method or EntryKind.Note or EntryKind.FollowUp =>
            [new("", Names(kind))],
    };

    private static FormGroup[] Settings(VentilationMode? mode) => mode switch
    {
        null => [new("", ["effectiveAt", "mode"])],
        VentilationMode.Other => [new("", ["effectiveAt", "mode", "modeText", "fiO2"]), new("As far as they apply", Rest("effectiveAt", "mode", "modeText", "fiO2", "phase", "reason")), Why],
        { } known =>
        [
            new("", ["effectiveAt", "mode"]),
            new("Settings", [.. SettingCheck.FieldsOf(known).Where(f => SettingCheck.Needs(known, f)), "fiO2"]),
            .. Optional(known),
            Why,
        ],
    };

    private static FormGroup Why => new("Why", ["phase", "reason"]);

    private static IEnumerable<FormGroup> Optional(VentilationMode mode) =>
        SettingCheck.FieldsOf(mode).Except(["effectiveAt", "mode", "fiO2", "phase", "reason"]).Where(f => !SettingCheck.Needs(mode, f)).ToArray() is { Length: > 0 } optional
            ? [new("If set", optional)]
            : [];

    /// <summary>What belongs to the other way of ventilating is folded away, not lost.</summary>
    private static FormGroup[] ForMode(FormGroup[] groups, VentilationMode? mode)
    {
        string[] seldom = mode switch { VentilationMode.Aprv => ConventionalOnly, null or VentilationMode.Other => [], _ => ReleaseOnly };
        var shown = groups.Select(g => g with { Fields = [.. g.Fields.Except(seldom)] }).Where(g => g.Fields.Count > 0);
        return seldom.Length == 0 ? [.. shown] : [.. shown, new("Seldom read in this mode", seldom, Folded: true)];
    }

    private static string[] Rest(params string[] before) => [.. Names(EntryKind.SettingChange).Except(before)];

    private static string[] Names(EntryKind kind) => [.. EntryFields.Of(EntryTypes.Of(kind)).Select(f => f.Name)];
}
