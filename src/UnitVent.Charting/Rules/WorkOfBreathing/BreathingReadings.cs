using NodaTime;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Pictures;

namespace UnitVent.Charting.Rules.WorkOfBreathing;

/// <summary>The youngest readings of how the patient breathes, of ventilator checks and breathing checks alike; none past its limit.</summary>
internal static class BreathingReadings
{
    /// <summary>The patient's own rate a minute.</summary>
    public static (double Value, Instant At, Guid Entry)? OwnRate(PatientPicture picture) =>
        Youngest(picture, c => c.SpontaneousRatePerMin, b => b.SpontaneousRatePerMin);

    /// <summary>The patient's own rate; without one the total rate, which in APRV counts the releases as well and is left out there.</summary>
    public static (double Value, Instant At, Guid Entry)? Rate(PatientPicture picture)
    {
        var releases = picture.Settings?.Body.Mode == VentilationMode.Aprv;
        return Youngest(picture, c => c.SpontaneousRatePerMin ?? (releases ? null : c.TotalRatePerMin), b => b.SpontaneousRatePerMin);
    }

    /// <summary>The volume of the patient's own breaths in mL.</summary>
    public static (double Value, Instant At, Guid Entry)? OwnVolume(PatientPicture picture) =>
        Youngest(picture, c => c.SpontaneousTidalVolumeMl, b => b.SpontaneousTidalVolumeMl);

    /// <summary>How hard the patient works.</summary>
    public static (Effort Value, Instant At, Guid Entry)? Effort(PatientPicture picture) =>
        Latest(picture, b => b.Effort is not null) is { } seen ? (seen.Body.Effort!.Value, seen.At, seen.Id) : null;

    /// <summary>The Richmond agitation–sedation score.</summary>
    public static (int Value, Instant At, Guid Entry)? Rass(PatientPicture picture) =>
        Latest(picture, b => b.Rass is not null) is { } seen ? (seen.Body.Rass!.Value, seen.At, seen.Id) : null;

    private static (double Value, Instant At, Guid Entry)? Youngest(
        PatientPicture picture, Func<VentilatorCheck, decimal?> ofCheck, Func<BreathingCheck, decimal?> ofBreathing)
    {
        var check = picture.Window.Latest<VentilatorCheck>(EntryKind.VentilatorCheck, picture.AsOf, c => ofCheck(c) is not null) is { } c && IsFresh(picture, c.At) ? c : (Charted<VentilatorCheck>?)null;
        var breathing = Latest(picture, b => ofBreathing(b) is not null);
        return check is { } one && !(breathing?.At > one.At) ? ((double)ofCheck(one.Body)!.Value, one.At, one.Id)
            : breathing is { } other ? ((double)ofBreathing(other.Body)!.Value, other.At, other.Id)
            : null;
    }

    private static Charted<BreathingCheck>? Latest(PatientPicture picture, Func<BreathingCheck, bool> carries) =>
        picture.Window.Latest(EntryKind.BreathingCheck, picture.AsOf, carries) is { } seen && IsFresh(picture, seen.At) ? seen : null;

    private static bool IsFresh(PatientPicture picture, Instant at) => picture.AsOf - at <= picture.Limits.Readings;
}
