using NodaTime;
using UnitVent.Charting.Results;
using UnitVent.Simulation;
using UnitVent.Store.Episodes;
using UnitVent.Store.People;
using UnitVent.Store.Reading;
using UnitVent.Store.Recording;
using UnitVent.Store.Units;

namespace UnitVent.Web.Hosting;

/// <summary>Fills the invented unit through the same desks as any other, each entry at the time at which its story has it recorded.</summary>
/// <remarks>The unit's own time of making is the origin of its story: a later start goes on from where the last one stopped.</remarks>
public sealed class DemoUnitLoad
{
    private const int AtOnce = 4;
    private static readonly Duration Before = Duration.FromDays(4);

    private readonly IServiceProvider desks;
    private readonly SteppingClock clock;
    private readonly Instant now;
    private readonly CancellationToken cancel;

    private DemoUnitLoad(IServiceProvider desks, SteppingClock clock, CancellationToken cancel) =>
        (this.desks, this.clock, now, this.cancel) = (desks, clock, MachineClock.Clock.GetCurrentInstant(), cancel);

    /// <summary>Makes the unit when it is absent, tops it up to now, and makes its people.</summary>
    /// <returns>How to sign in.</returns>
    /// <exception cref="InvalidDataException">The store refused a part of the story.</exception>
    public static async Task<string> RunAsync(Database database, CancellationToken cancel)
    {
        var clock = new SteppingClock();
        await using var desks = StoreSession.Services(database.HastyConnection, clock);
        var load = new DemoUnitLoad(desks, clock, cancel);
        await load.TopUpAsync();
        clock.Set(load.now);
        return await new DemoPeople(desks, database, cancel).EnsureAsync();
    }

    private async Task TopUpAsync()
    {
        var units = desks.GetRequiredService<UnitDesk>();
        clock.Set(now - Before);
        var known = (await Done(units.ListAsync(UserDesk.CommandLine, cancel))).FirstOrDefault(u => u.Profile.Code == DemoPeople.UnitCode);
        var story = DemoUnit.Create(Path.Combine(AppContext.BaseDirectory, "demo-seed"), known?.CreatedAt ?? now - Before, now);
        var unitId = known?.Profile.Id ?? await Done(units.CreateAsync(UserDesk.CommandLine, Unit(story), cancel));
        var standing = known?.TakenBeds ?? [];
        await Parallel.ForEachAsync(
            story.Episodes,
            new ParallelOptions { MaxDegreeOfParallelism = AtOnce, CancellationToken = cancel },
            async (episode, _) => await TellAsync(episode, unitId, standing.Contains(episode.Admission.Bed)));
    }

    private async Task TellAsync(SimulatedEpisode episode, Guid unitId, bool stands)
    {
        var (recorder, id) = (desks.GetRequiredService<ChartRecorder>(), episode.Admission.Id);
        if (!stands)
        {
            clock.Set(episode.AdmittedAt);
            var admitted = await desks.GetRequiredService<EpisodeDesk>()
                .AdmitAsync(Staff("Admitting nurse", UnitRoleName.Nurse, unitId), DemoPeople.UnitCode, episode.Admission, cancel);
            if (admitted.Refusal == Refusal.Conflict)
            {
                return; // The bed is somebody else's by now: its story ends.
            }

            await Done(Task.FromResult(admitted));
        }

        clock.Set(now);
        var last = stands ? await LastRecordedAsync(id, unitId) : Instant.MinValue;
        foreach (var action in episode.Actions.Where(a => a.RecordedAt > last))
        {
            clock.Set(action.RecordedAt);
            var recorded = await recorder.RecordAsync(Staff(action.By, action.Role, unitId), id, action.Entries, cancel);
            if (recorded.Refusal is not (null or Refusal.NotFound or Refusal.Conflict))
            {
                await Done(Task.FromResult(recorded));
            }
        }
    }

    private async Task<Instant> LastRecordedAsync(Guid episodeId, Guid unitId)
    {
        var page = await desks.GetRequiredService<ChartReader>()
            .EntriesAsync(Staff("Reader", UnitRoleName.Nurse, unitId), episodeId, new EntryQuery(Limit: 500), cancel);
        return page.Succeeded ? page.Value.Items.Select(e => e.RecordedAt).DefaultIfEmpty(Instant.MinValue).Max() : Instant.MaxValue;
    }

    private static NewUnit Unit(SimulatedUnit story) => new(story.Code, story.Name, story.TimeZone, story.Beds)
    {
        IsDemo = true,
        Settings = new UnitSettings { AltitudeM = story.AltitudeM },
    };

    private static Actor Staff(string name, UnitRoleName role, Guid unitId) =>
        new(null, name, false, new Dictionary<Guid, UnitRole> { [unitId] = Enum.Parse<UnitRole>(role.ToString()) });

    private static async Task<T> Done<T>(Task<Result<T>> step)
    {
        var result = await step;
        return result.Succeeded
            ? result.Value
            : throw new InvalidDataException("The demo unit could not be filled: " + string.Join(" ", result.Errors.Select(e => $"{e.Field}: {e.Message}")));
    }
}
