using UnitVent.Charting.Entries;
using UnitVent.Charting.Pictures;

namespace UnitVent.Charting.Rules.Liberation;

internal static class BreathingTrial
{
    /// <summary>The trial that is going on; null when none is.</summary>
    public static Charted<BedsideEvent>? Ongoing(PatientPicture picture) => picture.Ongoing.Contains(EventKind.BreathingTrialStart)
        ? picture.Window.Latest<BedsideEvent>(EntryKind.Event, picture.AsOf, e => e.What == EventKind.BreathingTrialStart)
        : null;
}
