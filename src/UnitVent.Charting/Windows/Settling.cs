using NodaTime;
using UnitVent.Charting.Entries;

namespace UnitVent.Charting.Windows;

/// <summary>When a value says nothing about the settings: too soon after they were changed, or after the patient was disturbed [common practice].</summary>
internal static class Settling
{
    private static readonly Duration AfterDisturbance = Duration.FromMinutes(20);
    private static readonly Duration AfterOxygenFraction = Duration.FromMinutes(10);
    private static readonly Duration AfterPressureLowered = Duration.FromMinutes(5);
    private static readonly Duration AfterPressureRaised = Duration.FromMinutes(60);
    private static readonly Duration AfterVentilationRaised = Duration.FromMinutes(30);
    private static readonly Duration AfterVentilationLowered = Duration.FromMinutes(60);
    private static readonly Duration Longest = Duration.FromMinutes(60);

    /// <summary>Whether an instant lies within 20 min after suction, disconnection, bronchoscopy or a turn.</summary>
    public static bool IsDisturbed(ChartWindow window, Instant at) =>
        window.Latest<BedsideEvent>(
            EntryKind.Event,
            at,
            e => e.What is EventKind.Suction or EventKind.Disconnection or EventKind.Bronchoscopy or EventKind.Prone or EventKind.Supine or EventKind.Side)
        is { } disturbed && at - disturbed.At < AfterDisturbance;

    /// <summary>Whether oxygen still settles at an instant, after any change up to the settings that were in force.</summary>
    public static bool OfOxygenLasts(ChartWindow window, Charted<SettingChange>? settings, Instant at) => Lasts(window, settings, at, OfOxygen);

    /// <summary>Whether carbon dioxide still settles at an instant, after any change up to the settings that were in force.</summary>
    public static bool OfCarbonDioxideLasts(ChartWindow window, Charted<SettingChange>? settings, Instant at) => Lasts(window, settings, at, OfCarbonDioxide);

    /// <summary>The settling time of oxygen after a change, against the settings before it; none when there were none.</summary>
    public static Duration OfOxygen(ChartWindow window, Charted<SettingChange> change)
    {
        if (window.Latest<SettingChange>(EntryKind.SettingChange, change.At - Duration.Epsilon) is not { } before)
        {
            return Duration.Zero;
        }

        var pressure = Pressure(change.Body) - Pressure(before.Body);
        return pressure > 0 ? AfterPressureRaised
            : change.Body.FiO2 != before.Body.FiO2 ? AfterOxygenFraction
            : pressure < 0 ? AfterPressureLowered
            : Duration.Zero;
    }

    /// <summary>The settling time of carbon dioxide after a change, against the settings before it: shorter after ventilation was raised, none when it was left alone.</summary>
    public static Duration OfCarbonDioxide(ChartWindow window, Charted<SettingChange> change) =>
        window.Latest<SettingChange>(EntryKind.SettingChange, change.At - Duration.Epsilon) is not { } before ? Duration.Zero
        : Drive(change.Body) > Drive(before.Body) ? AfterVentilationRaised
        : Drive(change.Body) == Drive(before.Body) && change.Body.TLowS == before.Body.TLowS ? Duration.Zero
        : AfterVentilationLowered;

    private static bool Lasts(ChartWindow window, Charted<SettingChange>? settings, Instant at, Func<ChartWindow, Charted<SettingChange>, Duration> settling) =>
        settings is { } last && window.Of<SettingChange>(EntryKind.SettingChange, last.At)
            .SkipWhile(change => at - change.At >= Longest)
            .Any(change => settling(window, change) is var time && time > Duration.Zero && at - change.At < time);

    /// <summary>What sets the machine's ventilation, comparable within a mode: pressure step or volume times breaths a minute.</summary>
    private static decimal Drive(SettingChange s) => s.Mode switch
    {
        VentilationMode.Aprv => (s.PHighCmH2O - s.PLowCmH2O) / (s.THighS + s.TLowS) ?? 0,
        VentilationMode.VolumeControl => s.SetRatePerMin * s.TidalVolumeMl ?? 0,
        VentilationMode.PressureControl => s.SetRatePerMin * s.InspiratoryPressureAbovePeepCmH2O ?? 0,
        _ => s.PressureSupportCmH2O ?? 0,
    };

    private static decimal Pressure(SettingChange settings) =>
        (settings.PHighCmH2O ?? 0) + (settings.PeepCmH2O ?? 0) + (settings.InspiratoryPressureAbovePeepCmH2O ?? 0) + (settings.PressureSupportCmH2O ?? 0);
}
