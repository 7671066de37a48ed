using Microsoft.EntityFrameworkCore;
using NodaTime;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Results;
using UnitVent.Store.Auditing;
using UnitVent.Store.Model;
using UnitVent.Store.People;
using UnitVent.Store.Schema;

namespace UnitVent.Store.Recording;

/// <summary>Strikes out one entry.</summary>
internal static class StrikingOut
{
    public static async Task<Result<ChartEntry>> StrikeAsync(
        UnitVentDbContext db, Place place, Actor actor, Guid entryId, Strike strike, CancellationToken cancellationToken)
    {
        var episode = await Evaluation.LockAsync(db, place, cancellationToken);
        var entry = await db.Entries.AsNoTracking().FirstOrDefaultAsync(e => e.UnitId == place.UnitId && e.EpisodeId == place.EpisodeId && e.Id == entryId, cancellationToken);
        if (entry is null)
        {
            return Refusals.NotFound<ChartEntry>("entry");
        }

        if (await db.StrikeOuts.AsNoTracking().FirstOrDefaultAsync(s => s.UnitId == place.UnitId && s.EntryId == entryId, cancellationToken) is { } struck)
        {
            return struck.Id == strike.Id && struck.Reason == strike.Reason
                ? Result<ChartEntry>.Of(entry.ToEntry(new(struck.At, struck.By, struck.Reason)))
                : Result<ChartEntry>.Refused(Refusal.Conflict, "", "entry.struck", "The entry was struck out already.");
        }

        if (entry.RecordedById != actor.UserId && !actor.May(Operation.StrikeOthers, place.UnitId))
        {
            return Refusals.Denied<ChartEntry>();
        }

        db.StrikeOuts.Add(new StrikeOutRow { UnitId = place.UnitId, Id = strike.Id, EntryId = entryId, At = strike.Now, By = actor.Name, Reason = strike.Reason });
        AuditTrail.Add(db, place.UnitId, strike.Now, actor, "strike-out", entryId, entry.Kind.ToString());
        await db.SaveChangesAsync(cancellationToken);
        await Evaluation.AgainAsync(db, place, episode, strike.Now, cancellationToken);
        return Result<ChartEntry>.Of(entry.ToEntry(new(strike.Now, actor.Name, strike.Reason)));
    }

    internal readonly record struct Strike(Guid Id, string Reason, Instant Now);
}
