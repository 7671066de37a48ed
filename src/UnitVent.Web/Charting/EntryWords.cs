using NodaTime;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Fields;
using UnitVent.Web.Shared;

namespace UnitVent.Web.Charting;

/// <summary>What an entry says, on one line: every member that was recorded, as it was typed.</summary>
public static class EntryWords
{
    /// <summary>The members in words; the entry's own time and the unit of tensions left to their places.</summary>
    public static string Of(Entry body, Instant now, DateTimeZone zone)
    {
        var tension = (body as BloodGas)?.TensionUnit is { } unit ? Tensions.Name(unit) : "";
        var own = body.EffectiveAt();
        return string.Join(", ", EntryFields.Of(body.GetType())
            .Where(f => f.Name != "tensionUnit")
            .Select(f => (Field: f, Value: f.ValueIn(body)))
            .Where(m => m.Value is not null && !(m.Value is Instant at && at == own))
            .Select(m => Member(m.Field, m.Value!, tension, now, zone)));
    }

    /// <summary>The same in the trade's short form: what is read first, the rest left out.</summary>
    public static string Brief(Entry body, Instant now, DateTimeZone zone) => body switch
    {
        SettingChange settings => SettingWords.Whole(settings),
        BloodGas gas => Listed(
            $"{(gas.Specimen is { } s ? Words.Of(s) : "")} {Format.Typed(gas.PH)} / {Format.Typed(gas.PCO2)} / {Format.Typed(gas.PO2)}{(gas.TensionUnit is { } u ? " " + Tensions.Name(u) : "")}",
            Part("FiO2", gas.FiO2), Part("sO2", gas.SO2Percent, " %"), Part("bicarbonate", gas.BicarbonateMmolL), Part("BE", gas.BaseExcessMmolL), Part("lactate", gas.LactateMmolL)),
        VentilatorCheck check => Listed(
            check.SettingsConfirmed == true ? "settings seen" : null, Part("peak", check.PeakPressureCmH2O), Part("mean", check.MeanAirwayPressureCmH2O), Part("plateau", check.PlateauPressureCmH2O),
            Part("minute volume", check.TotalMinuteVolumeLMin, Own(check.SpontaneousMinuteVolumeLMin)), Part("rate", check.TotalRatePerMin, Own(check.SpontaneousRatePerMin)),
            Part("release", check.ReleaseVolumeMl, " mL"), Part("tidal volume", check.TidalVolumeMl, " mL"),
            check.PeakExpiratoryFlowLMin is null ? null : $"flow {Format.Typed(check.PeakExpiratoryFlowLMin)} → {Format.Typed(check.EndReleaseFlowLMin)} L/min",
            Part("SpO2", check.SpO2Percent, " %"), Part("MAP", check.MeanArterialPressureMmHg)),
        BreathingCheck breathing => Listed(
            Part("RASS", breathing.Rass), breathing.Effort is { } effort ? "effort: " + Words.Within(effort) : null, breathing.Comfort is { } comfort ? Words.Within(comfort) : null,
            breathing.Relaxant is { } relaxant and not Relaxant.None ? "relaxant: " + Words.Within(relaxant) : null, Part("own rate", breathing.SpontaneousRatePerMin), Part("SpO2", breathing.SpO2Percent, " %")),
        _ => Of(body, now, zone),
    };

    private static string Listed(params string?[] parts) => string.Join(", ", parts.OfType<string>());

    private static string? Part(string label, decimal? value, string unit = "") => value is null ? null : $"{label} {Format.Typed(value)}{unit}";

    private static string Own(decimal? value) => value is null ? "" : $" (own {Format.Typed(value)})";

    private static string Member(EntryField field, object value, string tension, Instant now, DateTimeZone zone) => value switch
    {
        Instant at => $"{field.Label.ToLowerInvariant()} {Format.Time(at, now, zone)}",
        true => field.Label.ToLowerInvariant(),
        false => $"{field.Label.ToLowerInvariant()}: no",
        Enum choice => field.Label is "Mode" or "What" or "Circumstance" or "Phase" or "Method" or "Specimen" ? Words.Of(choice) : $"{field.Label.ToLowerInvariant()}: {Words.Within(choice)}",
        string text => field.Label is "Note" or "What" ? text : $"{field.Label.ToLowerInvariant()}: {text}",
        _ => $"{field.Label} {LastValues.Shown(value)}{Unit(field, tension)}",
    };

    private static string Unit(EntryField field, string tension) => field.Number switch
    {
        { IsTension: true } => " " + tension,
        { Unit.Length: > 0 } number => " " + number.Unit,
        _ => "",
    };
}
