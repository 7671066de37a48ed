using Microsoft.EntityFrameworkCore;
using NodaTime;
using UnitVent.Charting.Flags;
using UnitVent.Charting.Pictures;
using UnitVent.Store.Live;
using UnitVent.Store.Model;
using UnitVent.Store.Reading;
using UnitVent.Store.Schema;

namespace UnitVent.Store.Recording;

/// <summary>Carries an episode's flags on to a new picture, in the transaction that made it new.</summary>
internal static class Evaluation
{
    /// <summary>The name under which the program itself appears.</summary>
    private const string Program = "UnitVent";

    /// <summary>Locks the head of an episode: one writer of a chart at a time.</summary>
    public static Task<EpisodeRow> LockAsync(UnitVentDbContext db, Place place, CancellationToken cancellationToken) =>
        db.Episodes.FromSql($"select * from episode where unit_id = {place.UnitId} and id = {place.EpisodeId} for update").FirstAsync(cancellationToken);

    /// <summary>Writes what the picture does to the flags, and when to look again; the caller saves and commits.</summary>
    public static async Task<IReadOnlyList<FlagStep>> CarryOnAsync(
        UnitVentDbContext db, EpisodeRow episode, PatientPicture picture, CancellationToken cancellationToken)
    {
        var rows = await db.Flags.Where(f => f.UnitId == episode.UnitId && f.EpisodeId == episode.Id && f.State == FlagState.Open).ToListAsync(cancellationToken);
        return CarryOn(db, episode, picture, rows);
    }

    /// <summary>The same with the episode's open flags at hand.</summary>
    public static IReadOnlyList<FlagStep> CarryOn(UnitVentDbContext db, EpisodeRow episode, PatientPicture picture, List<FlagRow> rows)
    {
        var open = rows.ConvertAll(r => r.ToFlag());
        var steps = FlagLedger.Next(open, picture, Guid.CreateVersion7);
        foreach (var step in steps)
        {
            var row = rows.Find(r => r.Id == step.FlagId);
            var flag = FlagLedger.Apply(row?.ToFlag(), step, episode.Id, picture.AsOf);
            if (row is null)
            {
                row = new FlagRow { UnitId = episode.UnitId, Id = step.FlagId };
                rows.Add(row);
                db.Flags.Add(row);
                db.UnitLookups.Add(new UnitLookupRow { Id = row.Id, UnitId = episode.UnitId, EpisodeId = episode.Id });
            }

            row.Take(flag);
            db.FlagEvents.Add(EventOf(row, step.Kind, picture.AsOf, Program));
        }

        episode.NextEvaluationAt = Soonest(picture.NextChangeAt, rows.Where(r => r.State == FlagState.Open).Select(r => r.ToFlag().ComesBackAt));
        return steps;
    }

    /// <summary>Reads the chart once more, carries the flags on, saves and tells; the caller commits.</summary>
    public static async Task AgainAsync(UnitVentDbContext db, Place place, EpisodeRow episode, Instant now, CancellationToken cancellationToken)
    {
        var window = await WindowLoader.OfLockedAsync(db, place, now, cancellationToken);
        await CarryOnAsync(db, episode, PatientPicture.At(window, now), cancellationToken);
        await db.SaveChangesAsync(cancellationToken);
        await Notices.SendAsync(db, place.UnitId, cancellationToken);
    }

    /// <summary>The event that keeps a flag's numbers of this moment.</summary>
    public static FlagEventRow EventOf(FlagRow flag, FlagStepKind kind, Instant at, string by) => new()
    {
        UnitId = flag.UnitId,
        Id = Guid.CreateVersion7(),
        FlagId = flag.Id,
        Kind = kind,
        At = at,
        By = by,
        Finding = flag.Finding,
        InHand = flag.InHand,
    };

    private static Instant? Soonest(Instant? change, IEnumerable<Instant?> others) => others.Append(change).Where(i => i is not null).DefaultIfEmpty(null).Min();
}
