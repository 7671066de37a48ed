using NodaTime;
using UnitVent.Charting.Bands;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Episodes;
using UnitVent.Charting.Flags;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Windows;

namespace UnitVent.Simulation.Tests.Demo;

/// <summary>A chart into which a simulated episode is recorded action by action, with the picture and the flags after each.</summary>
internal sealed class ReplayedChart
{
    private static readonly Duration WindowLength = Duration.FromHours(48);

    private static readonly UnitProfile Unit = new(Guid.NewGuid(), "DEMO", "Demonstration unit", DateTimeZoneProviders.Tzdb["Europe/Zurich"]) { AltitudeM = 408 };

    private readonly EpisodeFacts facts;
    private readonly List<ChartEntry> entries = [];
    private readonly List<Flag> open = [];
    private Instant now;

    public ReplayedChart(SimulatedEpisode episode)
    {
        var (admission, at) = (episode.Admission, episode.AdmittedAt);
        facts = new EpisodeFacts(admission.Id, Unit.Id, admission.Bed, admission.Patient, admission.AirwaySecuredAt, at);
        now = at;
        var bodies = admission.ContextFlags.Select(Entry (f) => new ContextChange { Flag = f, From = at })
            .Append(new PhaseChoice { Phase = admission.Phase, From = at });
        foreach (var body in admission.Method is { } method ? bodies.Append(new MethodChoice { Method = method, From = at }) : bodies)
        {
            Add(new NewEntry(Guid.NewGuid(), body), at, "Demo Physician");
        }
    }

    public IReadOnlyList<Flag> Open => open;

    /// <summary>The chart after everything was recorded and the flags were followed up to an instant.</summary>
    public static ReplayedChart Of(SimulatedEpisode episode, Instant until)
    {
        var chart = new ReplayedChart(episode);
        foreach (var action in episode.Actions)
        {
            chart.Record(action);
            chart.Follow();
        }

        chart.now = until;
        chart.Follow();
        return chart;
    }

    public void Record(SimulatedAction action)
    {
        now = action.RecordedAt;
        foreach (var entry in action.Entries)
        {
            Add(entry, action.RecordedAt, action.By);
        }
    }

    /// <summary>The last 48 h, and before them what lasts.</summary>
    public ChartWindow Window() => new(facts, Unit, entries.Where(e => e.EffectiveAt > now - WindowLength
        || e.Kind is EntryKind.SettingChange or EntryKind.Context or EntryKind.Target or EntryKind.Phase or EntryKind.Method or EntryKind.Event or EntryKind.FollowUp));

    public Standing Standing() => UnitVent.Charting.Bands.Standing.Of(open, PatientPicture.At(Window(), now));

    private void Follow()
    {
        foreach (var step in FlagLedger.Next(open, PatientPicture.At(Window(), now), Guid.NewGuid))
        {
            var before = open.Find(f => f.Id == step.FlagId);
            var after = FlagLedger.Apply(before, step, facts.Id, now);
            open.RemoveAll(f => f.Id == step.FlagId);
            if (after.State == FlagState.Open)
            {
                open.Add(after);
            }
        }
    }

    private void Add(NewEntry entry, Instant recordedAt, string by) =>
        entries.Add(new ChartEntry(entry.Id, facts.Id, entry.Body.EffectiveAt() ?? recordedAt, recordedAt, by, entries.Count + 1, entry.Body) { Confirmed = entry.Confirmed });
}
