using NodaTime;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Timelines;
using UnitVent.Web.Charting;

namespace UnitVent.Web.Board;

/// <summary>What changed at a bedside since the shift began, newest first.</summary>
public static class ShiftChanges
{
    /// <summary>When the shift began that is going on.</summary>
    public static Instant Began(PatientPicture picture)
    {
        var unit = picture.Window.Unit;
        var today = picture.AsOf.InZone(unit.Zone).Date;
        return unit.ShiftStarts
            .SelectMany(s => new[] { today.PlusDays(-1) + s, today + s })
            .Select(s => s.InZoneLeniently(unit.Zone).ToInstant())
            .Where(s => s <= picture.AsOf)
            .DefaultIfEmpty(picture.AsOf - Duration.FromHours(12))
            .Max();
    }

    /// <summary>The changes as words with their times.</summary>
    public static IReadOnlyList<(Instant At, string What)> Of(PatientPicture picture)
    {
        var from = Began(picture);
        return [.. picture.Window.Standing
            .Where(e => e.EffectiveAt >= from && e.EffectiveAt <= picture.AsOf)
            .Select(e => (At: e.EffectiveAt, What: Said(e, picture)))
            .Where(c => c.What is not null)
            .Select(c => (c.At, c.What!))
            .Reverse()];
    }

    private static string? Said(ChartEntry entry, PatientPicture picture) => entry.Body switch
    {
        SettingChange after => TimelineMarks.Changed(picture.Window.Latest<SettingChange>(EntryKind.SettingChange, entry.EffectiveAt - Duration.Epsilon)?.Body, after),
        BedsideEvent happened => Words.Of(happened.What!.Value) + (happened.Detail is { Length: > 0 } d ? ": " + d : ""),
        ContextChange { Flag: { } flag } context => Words.Of(flag) + (context.Until is null ? " from now on" : " ended"),
        TargetSet => "Targets set",
        PhaseChoice { Phase: { } phase } => "Phase: " + Words.Within(phase),
        MethodChoice { Method: { } method } => "Method: " + Words.Within(method),
        _ => null,
    };
}
