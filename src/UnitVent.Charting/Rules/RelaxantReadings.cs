using NodaTime;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Pictures;

namespace UnitVent.Charting.Rules;

/// <summary>Whether a relaxant acts, by event or by breathing check.</summary>
internal static class RelaxantReadings
{
    /// <summary>Since when a relaxant acts, with the entry that says so; null when none is charted.</summary>
    public static (Instant Since, Guid Entry)? Acting(PatientPicture picture)
    {
        var (window, at) = (picture.Window, picture.AsOf);
        if (picture.Ongoing.Contains(EventKind.RelaxantStart))
        {
            var begun = window.Latest<BedsideEvent>(EntryKind.Event, at, e => e.What == EventKind.RelaxantStart)!.Value;
            return (begun.At, begun.Id);
        }

        var ended = window.Latest<BedsideEvent>(EntryKind.Event, at, e => e.What == EventKind.RelaxantStop)?.At;
        return window.Latest<BreathingCheck>(EntryKind.BreathingCheck, at, c => c.Relaxant is not null) is { Body.Relaxant: not Relaxant.None } seen
            && at - seen.At <= picture.Limits.Readings
            && !(ended >= seen.At)
            ? (seen.At, seen.Id)
            : null;
    }
}
