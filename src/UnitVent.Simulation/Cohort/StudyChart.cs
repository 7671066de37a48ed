using NodaTime;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Episodes;
using UnitVent.Charting.Windows;
using UnitVent.Simulation.Randomness;

namespace UnitVent.Simulation.Cohort;

/// <summary>Records a told episode as a chart, in the order of recording, with what admission records by itself.</summary>
internal static class StudyChart
{
    public static ChartWindow Of(SimulatedEpisode episode, UnitProfile unit)
    {
        var (admission, at) = (episode.Admission, episode.AdmittedAt);
        var facts = new EpisodeFacts(admission.Id, unit.Id, admission.Bed, admission.Patient, admission.AirwaySecuredAt, at);
        IEnumerable<(Guid, Entry, Instant, string)> admitted =
        [
            (SeededId.At(at, new KeyedRandom(1)), new PhaseChoice { Phase = admission.Phase, From = at }, at, "Demo Physician"),
            (SeededId.At(at, new KeyedRandom(2)), new MethodChoice { Method = admission.Method, From = at }, at, "Demo Physician"),
        ];
        return new(facts, unit, admitted
            .Concat(episode.Actions.SelectMany(a => a.Entries.Select(e => (e.Id, e.Body, a.RecordedAt, a.By))))
            .Select((e, i) => new ChartEntry(e.Item1, facts.Id, e.Item2.EffectiveAt() ?? e.Item3, e.Item3, e.Item4, i + 1, e.Item2)));
    }
}
