using Microsoft.EntityFrameworkCore;
using NodaTime;
using UnitVent.Charting.Checking;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Results;
using UnitVent.Charting.Windows;
using UnitVent.Store.Auditing;
using UnitVent.Store.Live;
using UnitVent.Store.Model;
using UnitVent.Store.People;
using UnitVent.Store.Reading;
using UnitVent.Store.Schema;

namespace UnitVent.Store.Recording;

/// <summary>Records the entries of one round: seen before? allowed? then rows, audit, flags.</summary>
internal static class RecordingEntries
{
    private static readonly Duration LateEntries = Duration.FromHours(24);

    public static async Task<Result<RecordReceipt>> RecordAsync(
        UnitVentDbContext db, Place place, Actor actor, List<NewEntry> entries, Instant now, CancellationToken cancellationToken)
    {
        var episode = await Evaluation.LockAsync(db, place, cancellationToken);
        var window = await WindowLoader.OfLockedAsync(db, place, now, cancellationToken);
        var ids = entries.Select(e => e.Id).ToArray();
        var stood = await db.Entries.AsNoTracking().Where(e => e.UnitId == place.UnitId && ids.Contains(e.Id)).ToListAsync(cancellationToken);
        if (stood.Count > 0)
        {
            return Again(stood, entries, place, window, now);
        }

        if (episode.EndedAt is { } ended && now - ended > LateEntries)
        {
            return Refusals.Ended<RecordReceipt>();
        }

        var taken = entries.ConvertAll(e => e.Body.EffectiveAt() is { } at && at > now && at <= now + TimeCheck.Ahead ? e with { Body = e.Body.EffectiveFrom(now) } : e);
        var errors = Verdict(taken, window, now).Concat(await CorrectionsAsync(db, place, actor, taken, cancellationToken)).ToList();
        return errors.Count > 0
            ? Result<RecordReceipt>.Refused(Refusal.Value, errors)
            : await InsertAsync(db, episode, actor, taken, window, now, cancellationToken);
    }

    private static Result<RecordReceipt> Again(List<EntryRow> stood, List<NewEntry> entries, Place place, ChartWindow window, Instant now)
    {
        var same = entries.TrueForAll(e => stood.Find(s => s.Id == e.Id) is { } row && row.EpisodeId == place.EpisodeId && row.Corrects == e.Corrects && SameBody(row, e));
        if (!same)
        {
            return Refusals.IdUsed<RecordReceipt>();
        }

        var picture = PatientPicture.At(window, now);
        return Result<RecordReceipt>.Of(new([.. entries.Select(e => stood.Find(s => s.Id == e.Id)!.ToEntry())], true, picture, picture, []));
    }

    // A time up to two minutes ahead was taken as the time of recording.
    private static bool SameBody(EntryRow row, NewEntry entry) =>
        row.ReadBody().Equals(entry.Body)
        || (entry.Body.EffectiveAt() is { } at && at > row.EffectiveAt && at <= row.RecordedAt + TimeCheck.Ahead && row.ReadBody().Equals(entry.Body.EffectiveFrom(row.EffectiveAt)));

    private static IEnumerable<FieldError> Verdict(List<NewEntry> entries, ChartWindow window, Instant now)
    {
        var chart = window;
        for (var i = 0; i < entries.Count; i++)
        {
            foreach (var error in EntryCheck.Verdict(entries[i], chart, now))
            {
                yield return error with { Field = Prefix(entries, i) + error.Field };
            }

            chart = chart.With([Preview(entries[i], window.Episode.Id, now, i)]);
        }
    }

    private static ChartEntry Preview(NewEntry entry, Guid episodeId, Instant now, int order) =>
        new(entry.Id, episodeId, entry.Body.EffectiveAt() ?? now, now, "", long.MaxValue - int.MaxValue + order, entry.Body) { Corrects = entry.Corrects };

    private static async Task<List<FieldError>> CorrectionsAsync(UnitVentDbContext db, Place place, Actor actor, List<NewEntry> entries, CancellationToken cancellationToken)
    {
        var errors = new List<FieldError>();
        for (var i = 0; i < entries.Count; i++)
        {
            if (entries[i] is not { Corrects: { } corrected } entry)
            {
                continue;
            }

            var target = await db.Entries.FromSql($"select * from standing_entry").AsNoTracking()
                .FirstOrDefaultAsync(e => e.UnitId == place.UnitId && e.EpisodeId == place.EpisodeId && e.Id == corrected, cancellationToken);
            if (target is null || target.Kind != entry.Body.Kind || entries.Take(i).Any(e => e.Corrects == corrected))
            {
                errors.Add(new(Prefix(entries, i) + "corrects", "corrects.unknown", "The entry to correct does not stand in this chart, or is of another kind."));
            }
            else if (target.RecordedById != actor.UserId && !actor.May(Operation.StrikeOthers, place.UnitId))
            {
                errors.Add(new(Prefix(entries, i) + "corrects", "denied", "Only a charge therapist or a physician corrects what somebody else charted."));
            }
        }

        return errors;
    }

    private static string Prefix(List<NewEntry> entries, int i) => entries.Count > 1 ? $"entries[{i}]." : "";

    private static async Task<Result<RecordReceipt>> InsertAsync(
        UnitVentDbContext db, EpisodeRow episode, Actor actor, List<NewEntry> entries, ChartWindow window, Instant now, CancellationToken cancellationToken)
    {
        var rows = entries.ConvertAll(e => EntryRow.Of(episode.UnitId, episode.Id, e, now, actor));
        db.Entries.AddRange(rows);
        foreach (var row in rows)
        {
            AuditTrail.Add(db, episode.UnitId, now, actor, "record", row.Id, row.Kind + (row.Corrects is null ? "" : " correction"));
        }

        db.UnitLookups.AddRange(rows.Where(r => r.Kind == EntryKind.FollowUp).Select(r => new UnitLookupRow { Id = r.Id, UnitId = episode.UnitId, EpisodeId = episode.Id }));
        await db.SaveChangesAsync(cancellationToken);

        var recorded = rows.ConvertAll(r => r.ToEntry());
        var later = recorded.TrueForAll(e => e.Corrects is null && e.EffectiveAt > now - ChartWindow.Span)
            ? window.With(recorded)
            : await WindowLoader.OfLockedAsync(db, new Place(episode.UnitId, episode.Id), now, cancellationToken);
        var (before, after) = (PatientPicture.At(window, now), PatientPicture.At(later, now));
        var steps = await Evaluation.CarryOnAsync(db, episode, after, cancellationToken);
        await db.SaveChangesAsync(cancellationToken);
        await Notices.SendAsync(db, episode.UnitId, cancellationToken);
        return Result<RecordReceipt>.Of(new(recorded, false, before, after, steps));
    }
}
