using System.Globalization;
using UnitVent.Charting.Entries;

namespace UnitVent.Web.Charting;

/// <summary>Settings in the trade's short form.</summary>
public static class SettingWords
{
    /// <summary>Mode and settings without FiO2: <c>APRV 28/5 4.5/0.5</c>.</summary>
    public static string Brief(SettingChange s) => s.Mode switch
    {
        VentilationMode.Aprv => $"APRV {N(s.PHighCmH2O)}/{N(s.PLowCmH2O)} {N(s.THighS)}/{N(s.TLowS)}" + Support(s),
        VentilationMode.VolumeControl => $"VC {N(s.TidalVolumeMl)} mL × {N(s.SetRatePerMin)}, PEEP {N(s.PeepCmH2O)}",
        VentilationMode.PressureControl => $"PC {N(s.InspiratoryPressureAbovePeepCmH2O)} above {N(s.PeepCmH2O)} × {N(s.SetRatePerMin)}, Ti {N(s.InspiratoryTimeS)}",
        VentilationMode.PressureSupport => $"PS {N(s.PressureSupportCmH2O)} above {N(s.PeepCmH2O)}",
        VentilationMode.Cpap => $"CPAP {N(s.PeepCmH2O)}",
        VentilationMode.Other or null => s.ModeText ?? "Another mode",
    };

    /// <summary>The short form with FiO2.</summary>
    public static string Whole(SettingChange s) => $"{Brief(s)}, FiO2 {N(s.FiO2)}";

    private static string Support(SettingChange s) => s.PressureSupportCmH2O is > 0 and var support ? $" PS {N(support)}" : "";

    private static string N(decimal? value) => value?.ToString("0.###", CultureInfo.InvariantCulture) ?? "–";
}
