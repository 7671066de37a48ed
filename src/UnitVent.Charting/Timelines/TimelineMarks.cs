using System.Globalization;
using System.Text.Json;
using NodaTime;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Fields;
using UnitVent.Charting.Windows;

namespace UnitVent.Charting.Timelines;

/// <summary>What is marked on every lane: setting changes with what changed, events, notes.</summary>
public static class TimelineMarks
{
    private static readonly string[] NotSettings = ["effectiveAt", "phase", "reason"];

    internal static IEnumerable<TimelineMark> Of(ChartWindow window, Instant from, Instant to)
    {
        SettingChange? before = null;
        foreach (var entry in window.Standing.Where(e => e.EffectiveAt <= to))
        {
            var mark = entry.Body switch
            {
                SettingChange settings => new TimelineMark(entry.EffectiveAt, "settingChange", Changed(before, settings), entry.Id),
                BedsideEvent happened => new TimelineMark(entry.EffectiveAt, "event", Words(happened.What!.Value) + (happened.Detail is { } d ? ": " + d : ""), entry.Id),
                Note note => new TimelineMark(entry.EffectiveAt, "note", note.Text!, entry.Id),
                _ => null,
            };
            before = entry.Body as SettingChange ?? before;
            if (mark is not null && entry.EffectiveAt >= from)
            {
                yield return mark;
            }
        }
    }

    /// <summary>The setting changes of a range that changed anything; a confirmation does not.</summary>
    internal static IEnumerable<TimelineMark> SettingChanges(ChartWindow window, Instant from, Instant to)
    {
        SettingChange? before = null;
        foreach (var change in window.Of<SettingChange>(EntryKind.SettingChange, to))
        {
            if (change.At >= from && before is not null && Changes(before, change.Body) is { Count: > 0 } changes)
            {
                yield return new(change.At, "settingChange", string.Join(", ", changes), change.Id);
            }

            before = change.Body;
        }
    }

    /// <summary>What one setting change changed against the settings before it, for example "P high 28 → 26 cmH2O".</summary>
    public static string Changed(SettingChange? before, SettingChange after) =>
        Changes(before, after) is { Count: > 0 } changes ? string.Join(", ", changes) : "settings confirmed";

    private static List<string> Changes(SettingChange? before, SettingChange after) =>
        [.. EntryFields.Of<SettingChange>()
            .Where(f => !NotSettings.Contains(f.Name))
            .Select(f => (Field: f, Before: before is null ? null : f.ValueIn(before), After: f.ValueIn(after)))
            .Where(c => c.After is not null && !Equals(c.Before, c.After))
            .Select(c => $"{c.Field.Label} {(c.Before is null ? "" : Shown(c.Before) + " → ")}{Shown(c.After!)}{Unit(c.Field)}")];

    private static string Unit(EntryField field) => field.Number is { Unit.Length: > 0 } number ? " " + number.Unit : "";

    private static string Shown(object value) => value is string text ? text : value is Enum choice ? Words(choice) : ((IFormattable)value).ToString(null, CultureInfo.InvariantCulture);

    private static string Words(Enum choice) =>
        string.Concat(JsonNamingPolicy.CamelCase.ConvertName(choice.ToString()).Select(c => char.IsUpper(c) ? " " + char.ToLowerInvariant(c) : c.ToString()));
}
