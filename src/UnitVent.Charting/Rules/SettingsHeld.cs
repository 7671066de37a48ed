using NodaTime;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Windows;

namespace UnitVent.Charting.Rules;

/// <summary>Since when the settings in force are what they are, as far as a rule cares.</summary>
internal static class SettingsHeld
{
    /// <summary>Since when the mode.</summary>
    public static Instant ModeSince(PatientPicture picture) => Since(picture, s => s.Mode);

    /// <summary>Since when the pressures of the releases.</summary>
    public static Instant PressuresSince(PatientPicture picture) => Since(picture, s => (s.Mode, s.PHighCmH2O, s.PLowCmH2O));

    /// <summary>Since when the pressures and times of the releases.</summary>
    public static Instant CycleSince(PatientPicture picture) => Since(picture, s => (s.Mode, s.PHighCmH2O, s.PLowCmH2O, s.THighS, s.TLowS));

    /// <summary>Since when everything but the oxygen fraction.</summary>
    public static Instant VentilationSince(PatientPicture picture) =>
        Since(picture, s => s with { ChangedAt = null, FiO2 = null, Phase = null, Reason = null });

    /// <summary>The settings in force, in APRV and not past their limit; null otherwise.</summary>
    public static Charted<SettingChange>? Aprv(PatientPicture picture) =>
        picture.Settings is { Body.Mode: VentilationMode.Aprv } settings && picture.AsOf - picture.SettingsConfirmedAt <= picture.Limits.Settings ? settings : null;

    private static Instant Since<T>(PatientPicture picture, Func<SettingChange, T> picked) =>
        InForce.UnchangedSince(picture.Window, picture.AsOf, picked) ?? Instant.MinValue;
}
