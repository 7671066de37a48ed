using System.Globalization;
using Microsoft.EntityFrameworkCore;
using NodaTime;
using UnitVent.Charting.Bands;
using UnitVent.Charting.Checking;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Episodes;
using UnitVent.Charting.Flags;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Results;
using UnitVent.Charting.Timelines;
using UnitVent.Store.Auditing;
using UnitVent.Store.People;
using UnitVent.Store.Schema;

namespace UnitVent.Store.Reading;

/// <summary>Reads charts.</summary>
public sealed class ChartReader
{
    private const int LargestPage = 500;

    private readonly UnitScope scope;
    private readonly IClock clock;

    internal ChartReader(UnitScope scope, IClock clock) => (this.scope, this.clock) = (scope, clock);

    /// <summary>The units that the actor may see, by code.</summary>
    public Task<Result<IReadOnlyList<UnitProfile>>> UnitsAsync(Actor actor, CancellationToken cancellationToken) =>
        scope.OutsideAsync(
            async db =>
            {
                var ids = actor.Units.Keys.ToArray();
                var units = await db.Units.AsNoTracking().Where(u => ids.Contains(u.Id)).OrderBy(u => u.Code).ToListAsync(cancellationToken);
                var beds = await db.Beds.AsNoTracking().Where(b => ids.Contains(b.UnitId) && !b.Retired).OrderBy(b => b.Position).ToListAsync(cancellationToken);
                var byUnit = beds.ToLookup(b => b.UnitId, b => b.Name);
                return Result<IReadOnlyList<UnitProfile>>.Of([.. units.Select(u => WindowLoader.Profile(u, [.. byUnit[u.Id]]))]);
            },
            cancellationToken);

    /// <summary>One patient now, or at an instant in the past: then from the entries effective by then, with the flags that the rules find on that picture.</summary>
    public Task<Result<PatientChart>> PatientAsync(Actor actor, Guid episodeId, Instant? at, CancellationToken cancellationToken) =>
        scope.WithAsync(
            actor,
            episodeId,
            "episode",
            Operation.Read,
            async (db, place) =>
            {
                var now = clock.GetCurrentInstant();
                if (at > now + TimeCheck.Ahead)
                {
                    return Result<PatientChart>.Refused(Refusal.Value, "at", "time.future", "The instant lies in the future.");
                }

                var window = await WindowLoader.OfEpisodeAsync(db, place, at ?? now, cancellationToken);
                if (window is null)
                {
                    return Refusals.NotFound<PatientChart>("episode");
                }

                var picture = PatientPicture.At(window, at ?? now);
                var flags = at is null
                    ? await OpenFlagsAsync(db, place, cancellationToken)
                    : [.. FlagLedger.Next([], picture, Guid.CreateVersion7).Select(s => FlagLedger.Apply(null, s, episodeId, s.Finding.SeenAt))];
                return Result<PatientChart>.Of(new(window, picture, flags, Standing.Of(flags, picture)));
            },
            cancellationToken);

    /// <summary>The entries of an episode, newest first, in pages.</summary>
    public Task<Result<EntryPage>> EntriesAsync(Actor actor, Guid episodeId, EntryQuery query, CancellationToken cancellationToken) =>
        scope.WithAsync(actor, episodeId, "episode", Operation.Read, (db, place) => PageAsync(db, place, query, cancellationToken), cancellationToken);

    /// <summary>The flags of an episode, newest first.</summary>
    /// <param name="actor">Who asks.</param>
    /// <param name="episodeId">The episode.</param>
    /// <param name="all">Whether closed ones are wanted too.</param>
    /// <param name="cancellationToken">Gives up.</param>
    public Task<Result<IReadOnlyList<Flag>>> FlagsAsync(Actor actor, Guid episodeId, bool all, CancellationToken cancellationToken) =>
        scope.WithAsync(
            actor,
            episodeId,
            "episode",
            Operation.Read,
            async (db, place) => Result<IReadOnlyList<Flag>>.Of([.. (await db.Flags.AsNoTracking()
                .Where(f => f.UnitId == place.UnitId && f.EpisodeId == place.EpisodeId && (all || f.State == FlagState.Open))
                .OrderByDescending(f => f.Since)
                .ToListAsync(cancellationToken)).Select(f => f.ToFlag())]),
            cancellationToken);

    /// <summary>The series behind the lanes of the timeline.</summary>
    public Task<Result<Timeline>> TimelineAsync(Actor actor, Guid episodeId, Instant from, Instant to, CancellationToken cancellationToken) =>
        from >= to
            ? Task.FromResult(Result<Timeline>.Refused(Refusal.Value, "to", "time.order", "The end lies before the start."))
            : scope.WithAsync(
                actor,
                episodeId,
                "episode",
                Operation.Read,
                async (db, place) => await WindowLoader.OfEpisodeAsync(db, place, to, cancellationToken, from) is { } window
                    ? Result<Timeline>.Of(Timeline.Of(window, from, to))
                    : Refusals.NotFound<Timeline>("episode"),
                cancellationToken);

    /// <summary>Keeps that a sheet was printed.</summary>
    /// <param name="actor">Who printed.</param>
    /// <param name="episodeId">Of whom.</param>
    /// <param name="cancellationToken">Gives up.</param>
    public Task<Result<bool>> PrintedAsync(Actor actor, Guid episodeId, CancellationToken cancellationToken) =>
        scope.WithAsync(
            actor,
            episodeId,
            "episode",
            Operation.Print,
            async (db, place) =>
            {
                AuditTrail.Add(db, place.UnitId, clock.GetCurrentInstant(), actor, "print", episodeId, "sheet");
                await db.SaveChangesAsync(cancellationToken);
                return Result<bool>.Of(true);
            },
            cancellationToken);

    internal static async Task<IReadOnlyList<Flag>> OpenFlagsAsync(UnitVentDbContext db, Place place, CancellationToken cancellationToken)
    {
        var rows = await db.Flags.AsNoTracking()
            .Where(f => f.UnitId == place.UnitId && f.EpisodeId == place.EpisodeId && f.State == FlagState.Open)
            .ToListAsync(cancellationToken);
        return rows.ConvertAll(r => r.ToFlag());
    }

    private static async Task<Result<EntryPage>> PageAsync(UnitVentDbContext db, Place place, EntryQuery query, CancellationToken cancellationToken)
    {
        var limit = Math.Clamp(query.Limit, 1, LargestPage);
        var entries = db.Entries.AsNoTracking().Where(e => e.UnitId == place.UnitId && e.EpisodeId == place.EpisodeId);
        entries = query.From is { } from ? entries.Where(e => e.EffectiveAt >= from) : entries;
        entries = query.To is { } to ? entries.Where(e => e.EffectiveAt <= to) : entries;
        entries = query.Kind is { } kind ? entries.Where(e => e.Kind == kind) : entries;
        if (query.After is { Length: > 0 } after)
        {
            if (Cursor(after) is not { } cursor)
            {
                return Result<EntryPage>.Refused(Refusal.Shape, "after", "shape.cursor", "The cursor is not one of this list.");
            }

            entries = entries.Where(e => e.EffectiveAt < cursor.At || (e.EffectiveAt == cursor.At && e.Sequence < cursor.Sequence));
        }

        var rows = await entries.OrderByDescending(e => e.EffectiveAt).ThenByDescending(e => e.Sequence).Take(limit + 1)
            .Select(e => new
            {
                Entry = e,
                Struck = db.StrikeOuts.Where(s => s.UnitId == e.UnitId && s.EntryId == e.Id).Select(s => new StrikeOut(s.At, s.By, s.Reason)).FirstOrDefault(),
                ReplacedBy = db.Entries.Where(c => c.UnitId == e.UnitId && c.Corrects == e.Id).Select(c => (Guid?)c.Id).FirstOrDefault(),
            })
            .ToListAsync(cancellationToken);
        var page = rows.Take(limit).Select(r => r.Entry.ToEntry(r.Struck, r.ReplacedBy)).ToList();
        return Result<EntryPage>.Of(new(page, rows.Count > limit ? CursorOf(page[^1]) : null));
    }

    private static string CursorOf(ChartEntry entry) => string.Create(CultureInfo.InvariantCulture, $"{entry.EffectiveAt.ToUnixTimeTicks()}-{entry.Sequence}");

    private static (Instant At, long Sequence)? Cursor(string text) =>
        text.Split('-') is [var ticks, var sequence]
        && long.TryParse(ticks, CultureInfo.InvariantCulture, out var at)
        && long.TryParse(sequence, CultureInfo.InvariantCulture, out var number)
            ? (Instant.FromUnixTimeTicks(at), number)
            : null;
}
