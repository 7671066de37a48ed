using NodaTime;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Fields;
using UnitVent.Charting.Results;
using UnitVent.Charting.Windows;

namespace UnitVent.Charting.Checking;

/// <summary>Holds the time at which an entry was so against now and against the episode.</summary>
public static class TimeCheck
{
    /// <summary>Gets how far ahead of the server a clock may be before its time is refused.</summary>
    public static Duration Ahead { get; } = Duration.FromMinutes(2);

    private static readonly Duration AskedAfter = Duration.FromHours(2);

    internal static IEnumerable<FieldError> Verdict(Entry body, ChartWindow window, Instant now)
    {
        if (body.EffectiveAt() is not { } at)
        {
            return [];
        }

        var field = EntryFields.Of(body.GetType()).First(f => f.Kind == FieldKind.Time && f.Required);
        return Against(field, body.Kind, at, window, now);
    }

    private static IEnumerable<FieldError> Against(EntryField field, EntryKind kind, Instant at, ChartWindow window, Instant now)
    {
        if (at > now + Ahead)
        {
            yield return new(field.Name, "time.future", $"{field.Label} {Shown(at)} lies in the future; it is {Shown(now)} now.");
        }

        if (window.Episode.EndedAt is { } ended && at > ended)
        {
            yield return new(field.Name, "time.after-end", $"{field.Label} {Shown(at)} lies after the end of the episode at {Shown(ended)}.");
        }

        var bedside = kind is EntryKind.BloodGas or EntryKind.SettingChange or EntryKind.VentilatorCheck or EntryKind.BreathingCheck or EntryKind.AirwayCheck;
        if (bedside && at < now - AskedAfter)
        {
            yield return new(field.Name, "ask." + field.Name, $"{field.Label} {Shown(at)} is more than 2 h ago. Is it so?");
        }

        if (bedside && at < window.Episode.AirwaySecuredAt)
        {
            yield return new(field.Name, "ask.beforeAirway", $"{field.Label} {Shown(at)} lies before the airway was secured. Is it so?");
        }

        string Shown(Instant instant) => instant.InZone(window.Unit.Zone).ToString("ddd d MMM HH:mm", System.Globalization.CultureInfo.InvariantCulture);
    }
}
