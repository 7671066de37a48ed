using System.Collections.Concurrent;
using Microsoft.EntityFrameworkCore;
using NodaTime;
using UnitVent.Charting.Bands;
using UnitVent.Charting.Flags;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Results;
using UnitVent.Store.Live;
using UnitVent.Store.People;
using UnitVent.Store.Schema;

namespace UnitVent.Store.Reading;

/// <summary>One board a unit and node, rebuilt once a change however many look at it.</summary>
public sealed class UnitBoards
{
    private readonly ConcurrentDictionary<Guid, Kept> kept = new();
    private readonly UnitScope scope;
    private readonly ChangeFeed feed;
    private readonly IClock clock;

    internal UnitBoards(UnitScope scope, ChangeFeed feed, IClock clock)
    {
        (this.scope, this.feed, this.clock) = (scope, feed, clock);
        feed.Noticed += Forget;
    }

    /// <summary>The board of a unit.</summary>
    public async Task<Result<UnitBoard>> GetAsync(Actor actor, string unitCode, CancellationToken cancellationToken)
    {
        var unit = await scope.OutsideAsync(
            async db => await db.Units.AsNoTracking().Where(u => u.Code == unitCode).Select(u => (Guid?)u.Id).FirstOrDefaultAsync(cancellationToken) is { } id
                && actor.May(Operation.Read, id)
                    ? Result<Guid>.Of(id)
                    : Refusals.NotFound<Guid>("unit"),
            cancellationToken);
        return unit.Succeeded ? await OfAsync(unit.Value, cancellationToken) : unit.As<UnitBoard>();
    }

    private async Task<Result<UnitBoard>> OfAsync(Guid unitId, CancellationToken cancellationToken)
    {
        var place = kept.GetOrAdd(unitId, _ => new Kept());
        await place.Gate.WaitAsync(cancellationToken);
        try
        {
            // A board is only as fresh as the feed that would have said otherwise.
            var version = place.Version;
            if (feed.Connected && place.Built is { } last && last.Version == version && !(last.Board.NextChangeAt <= clock.GetCurrentInstant()))
            {
                return Result<UnitBoard>.Of(last.Board);
            }

            var built = await scope.WithinAsync(unitId, (db, where) => BuildAsync(db, where.UnitId, clock.GetCurrentInstant(), cancellationToken), cancellationToken);
            place.Built = built.Succeeded ? new(version, built.Value) : null;
            return built;
        }
        finally
        {
            place.Gate.Release();
        }
    }

    internal static async Task<Result<UnitBoard>> BuildAsync(UnitVentDbContext db, Guid unitId, Instant now, CancellationToken cancellationToken)
    {
        var profile = await WindowLoader.ProfileAsync(db, unitId, now, cancellationToken);
        var windows = await WindowLoader.OfUnitAsync(db, profile, now, cancellationToken);
        var episodes = windows.Select(w => w.Episode.Id).ToArray();
        var flags = await db.Flags.AsNoTracking().TagWith("UnitBoards.Flags")
            .Where(f => f.UnitId == unitId && episodes.Contains(f.EpisodeId) && f.State == FlagState.Open)
            .ToListAsync(cancellationToken);
        var byEpisode = flags.ToLookup(f => f.EpisodeId, f => f.ToFlag());
        return Result<UnitBoard>.Of(UnitBoard.Of(profile, now, windows.Select(w =>
        {
            var picture = PatientPicture.At(w, now);
            List<Flag> open = [.. byEpisode[w.Episode.Id]];
            return new BoardRow(picture, open, Standing.Of(open, picture));
        })));
    }

    private void Forget(Guid? unitId)
    {
        foreach (var (id, place) in kept)
        {
            if (unitId is null || unitId == id)
            {
                place.Forget();
            }
        }
    }

    private sealed record Built(int Version, UnitBoard Board);

    /// <summary>The last board and the version it was built for; every notice makes a new version.</summary>
    private sealed class Kept
    {
        private int version;

        public SemaphoreSlim Gate { get; } = new(1, 1);

        public Built? Built { get; set; }

        public int Version => Volatile.Read(ref version);

        public void Forget() => Interlocked.Increment(ref version);
    }
}
