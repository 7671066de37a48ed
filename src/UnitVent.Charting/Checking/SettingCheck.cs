using UnitVent.Charting.Entries;
using UnitVent.Charting.Episodes;
using UnitVent.Charting.Fields;
using UnitVent.Charting.Results;
using UnitVent.Charting.Windows;

namespace UnitVent.Charting.Checking;

/// <summary>Holds a setting change against its mode: which members it needs, which it may have, and how they fit together.</summary>
public static class SettingCheck
{
    private static readonly string[] EveryMode = ["effectiveAt", "mode", "fiO2", "phase", "reason"];

    private static readonly Dictionary<VentilationMode, (string[] Needed, string[] Allowed)> Members = new()
    {
        [VentilationMode.Aprv] = (
            ["pHighCmH2O", "pLowCmH2O", "tHighS", "tLowS"],
            ["releaseEndedBy", "pressureSupportCmH2O", "pressureSupportReference", "tubeCompensation", "tubeCompensationPercent", "riseTimeS"]),
        [VentilationMode.VolumeControl] = (["setRatePerMin", "tidalVolumeMl", "peepCmH2O"], ["inspiratoryTimeS", "pauseTimeS"]),
        [VentilationMode.PressureControl] = (["setRatePerMin", "inspiratoryPressureAbovePeepCmH2O", "inspiratoryTimeS", "peepCmH2O"], ["riseTimeS"]),
        [VentilationMode.PressureSupport] = (["pressureSupportCmH2O", "peepCmH2O"], ["riseTimeS", "tubeCompensation", "tubeCompensationPercent"]),
        [VentilationMode.Cpap] = (["peepCmH2O"], ["tubeCompensation", "tubeCompensationPercent"]),
    };

    /// <summary>The fields that a mode shows, the needed ones first; every field for another mode.</summary>
    public static IReadOnlyList<string> FieldsOf(VentilationMode mode) => Members.TryGetValue(mode, out var members)
        ? [.. EveryMode[..3], .. members.Needed, .. members.Allowed, .. EveryMode[3..]]
        : [.. EntryFields.Of<SettingChange>().Select(f => f.Name)];

    /// <summary>Whether a mode cannot do without a field.</summary>
    public static bool Needs(VentilationMode mode, string field) => mode == VentilationMode.Other
        ? field == "modeText"
        : Members[mode].Needed.Contains(field);

    internal static IEnumerable<FieldError> Verdict(SettingChange settings, ChartWindow window) => settings.Mode is { } mode
        ? OfMode(settings, mode).Concat(FitTogether(settings)).Concat(TidalVolume(settings, window))
        : [];

    private static IEnumerable<FieldError> OfMode(SettingChange settings, VentilationMode mode)
    {
        var shown = FieldsOf(mode);
        foreach (var field in EntryFields.Of<SettingChange>())
        {
            var present = field.ValueIn(settings) is not null;
            if (!present && Needs(mode, field.Name))
            {
                yield return new(field.Name, "missing", $"{field.Label} is needed in this mode.");
            }
            else if (present && !shown.Contains(field.Name))
            {
                yield return new(field.Name, "mode", $"{field.Label} does not belong to this mode.");
            }
        }
    }

    private static IEnumerable<FieldError> FitTogether(SettingChange settings)
    {
        if (settings.PLowCmH2O >= settings.PHighCmH2O)
        {
            yield return new("pLowCmH2O", "limit.order", $"P low {settings.PLowCmH2O} cmH2O must be below P high {settings.PHighCmH2O} cmH2O.");
        }

        if (settings.TLowS > settings.THighS)
        {
            yield return new("tLowS", "ask.timesSwapped", $"T low {settings.TLowS} s is longer than T high {settings.THighS} s. Is it so?");
        }

        if (settings.InspiratoryTimeS * settings.SetRatePerMin > 60)
        {
            yield return new("inspiratoryTimeS", "limit.order", $"Inspiratory time {settings.InspiratoryTimeS} s does not fit into a rate of {settings.SetRatePerMin}/min.");
        }
    }

    private static IEnumerable<FieldError> TidalVolume(SettingChange settings, ChartWindow window)
    {
        if (settings.TidalVolumeMl is not { } volume || BodySize.PredictedWeightKg(window.Episode.Patient) is not { } weight)
        {
            yield break;
        }

        var perKg = (double)volume / weight;
        if (perKg is < 4 or > 8)
        {
            yield return new("tidalVolumeMl", "ask.tidalVolumeMl", FormattableString.Invariant($"Set tidal volume {volume} mL is {perKg:0.0} mL/kg of predicted body weight, outside 4–8. Is it so?"));
        }
    }
}
