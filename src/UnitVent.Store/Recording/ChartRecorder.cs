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

/// <summary>The only writer of charts. One call is one transaction: all of it is recorded, or nothing.</summary>
public sealed class ChartRecorder
{
    private static readonly Duration LateEntries = Duration.FromHours(24);

    private readonly UnitScope scope;
    private readonly IClock clock;

    internal ChartRecorder(UnitScope scope, IClock clock) => (this.scope, this.clock) = (scope, clock);

    /// <summary>Records entries, or says everything that speaks against them. Entries that had been recorded before are answered, not repeated.</summary>
    /// <param name="actor">Who records.</param>
    /// <param name="episodeId">The episode.</param>
    /// <param name="entries">The entries of one round, in order; the field names of errors are prefixed with <c>entries[i].</c> when there are several.</param>
    /// <param name="cancellationToken">Gives up.</param>
    public Task<Result<RecordReceipt>> RecordAsync(Actor actor, Guid episodeId, IReadOnlyList<NewEntry> entries, CancellationToken cancellationToken) =>
        scope.WithAsync(
            actor,
            episodeId,
            "episode",
            Operation.Read,
            (db, place) => entries.Any(e => !actor.May(Permissions.ToRecord(e.Body.Kind), place.UnitId))
                ? Task.FromResult(Refusals.Denied<RecordReceipt>())
                : RecordInAsync(db, place, actor, [.. entries], cancellationToken),
            cancellationToken);

    /// <summary>Strikes out an entry: it stays in the chart, marked, and counts no longer.</summary>
    public Task<Result<ChartEntry>> StrikeOutAsync(
        Actor actor, Guid episodeId, Guid entryId, Guid strikeId, string reason, CancellationToken cancellationToken) =>
        string.IsNullOrWhiteSpace(reason)
            ? Task.FromResult(Refusals.NeedsReason<ChartEntry>())
            : scope.WithAsync(
                actor, episodeId, "episode", Operation.Chart, (db, place) => StrikeInAsync(db, place, actor, entryId, strikeId, reason, cancellationToken), cancellationToken);

    /// <summary>Says what became of a follow-up.</summary>
    public Task<Result<FollowUpStep>> FollowUpStepAsync(
        Actor actor, Guid followUpId, Guid stepId, FollowUpStep step, string? reason, string? forRole, CancellationToken cancellationToken) =>
        scope.WithAsync(
            actor, followUpId, "follow-up", Operation.Chart, (db, place) => StepInAsync(db, place, actor, followUpId, new(stepId, step, reason, forRole), cancellationToken), cancellationToken);

    private async Task<Result<RecordReceipt>> RecordInAsync(UnitVentDbContext db, Place place, Actor actor, List<NewEntry> entries, CancellationToken cancellationToken)
    {
        var episode = await Evaluation.LockAsync(db, place, cancellationToken);
        var now = clock.GetCurrentInstant();
        var ids = entries.Select(e => e.Id).ToArray();
        var stood = await db.Entries.AsNoTracking().Where(e => e.UnitId == place.UnitId && ids.Contains(e.Id)).ToListAsync(cancellationToken);
        var window = await WindowLoader.OfEpisodeAsync(db, place, now, cancellationToken) ?? throw new InvalidOperationException("A locked episode has a window.");
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
        var same = entries.TrueForAll(e => stood.Find(s => s.Id == e.Id) is { } row && row.EpisodeId == place.EpisodeId && SameBody(row, e));
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
            var prefix = entries.Count > 1 ? $"entries[{i}]." : "";
            foreach (var error in EntryCheck.Verdict(entries[i], chart, now))
            {
                yield return error with { Field = prefix + error.Field };
            }

            chart = chart.With([Preview(entries[i], window.Episode.Id, now, i)]);
        }
    }

    private static ChartEntry Preview(NewEntry entry, Guid episodeId, Instant now, int order) =>
        new(entry.Id, episodeId, entry.Body.EffectiveAt() ?? now, now, "", long.MaxValue - int.MaxValue + order, entry.Body) { Corrects = entry.Corrects };

    private static async Task<List<FieldError>> CorrectionsAsync(UnitVentDbContext db, Place place, Actor actor, List<NewEntry> entries, CancellationToken cancellationToken)
    {
        var errors = new List<FieldError>();
        foreach (var entry in entries.Where(e => e.Corrects is not null))
        {
            var target = await db.Entries.FromSql($"select * from standing_entry").AsNoTracking()
                .FirstOrDefaultAsync(e => e.UnitId == place.UnitId && e.EpisodeId == place.EpisodeId && e.Id == entry.Corrects, cancellationToken);
            if (target is null || target.Kind != entry.Body.Kind)
            {
                errors.Add(new("corrects", "corrects.unknown", "The entry to correct does not stand in this chart, or is of another kind."));
            }
            else if (target.RecordedById != actor.UserId && !actor.May(Operation.StrikeOthers, place.UnitId))
            {
                errors.Add(new("corrects", "denied", "Only a charge therapist or a physician corrects what somebody else charted."));
            }
        }

        return errors;
    }

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
        try
        {
            await db.SaveChangesAsync(cancellationToken);
        }
        catch (DbUpdateException e) when (UniqueViolation.Is(e))
        {
            return Refusals.IdUsed<RecordReceipt>();
        }

        var recorded = rows.ConvertAll(r => r.ToEntry());
        var before = PatientPicture.At(window, now);
        var after = PatientPicture.At(window.With(recorded.Where(e => e.EffectiveAt > now - WindowLoader.Span)), now);
        var steps = await Evaluation.CarryOnAsync(db, episode, after, Evaluation.Program, cancellationToken);
        await db.SaveChangesAsync(cancellationToken);
        await Notices.SendAsync(db, episode.UnitId, cancellationToken);
        return Result<RecordReceipt>.Of(new(recorded, false, before, after, steps));
    }

    private async Task<Result<ChartEntry>> StrikeInAsync(
        UnitVentDbContext db, Place place, Actor actor, Guid entryId, Guid strikeId, string reason, CancellationToken cancellationToken)
    {
        var episode = await Evaluation.LockAsync(db, place, cancellationToken);
        var now = clock.GetCurrentInstant();
        var entry = await db.Entries.AsNoTracking().FirstOrDefaultAsync(e => e.UnitId == place.UnitId && e.EpisodeId == place.EpisodeId && e.Id == entryId, cancellationToken);
        if (entry is null)
        {
            return Refusals.NotFound<ChartEntry>("entry");
        }

        var struck = await db.StrikeOuts.AsNoTracking().FirstOrDefaultAsync(s => s.UnitId == place.UnitId && s.EntryId == entryId, cancellationToken);
        if (struck is not null)
        {
            return struck.Id == strikeId && struck.Reason == reason
                ? Result<ChartEntry>.Of(entry.ToEntry(new(struck.At, struck.By, struck.Reason)))
                : Result<ChartEntry>.Refused(Refusal.Conflict, "", "entry.struck", "The entry was struck out already.");
        }

        if (entry.RecordedById != actor.UserId && !actor.May(Operation.StrikeOthers, place.UnitId))
        {
            return Refusals.Denied<ChartEntry>();
        }

        db.StrikeOuts.Add(new StrikeOutRow { UnitId = place.UnitId, Id = strikeId, EntryId = entryId, At = now, By = actor.Name, Reason = reason });
        AuditTrail.Add(db, place.UnitId, now, actor, "strike-out", entryId, entry.Kind.ToString());
        await db.SaveChangesAsync(cancellationToken);
        await ReevaluateAsync(db, place, episode, now, cancellationToken);
        return Result<ChartEntry>.Of(entry.ToEntry(new(now, actor.Name, reason)));
    }

    private async Task<Result<FollowUpStep>> StepInAsync(UnitVentDbContext db, Place place, Actor actor, Guid followUpId, NewStep step, CancellationToken cancellationToken)
    {
        var episode = await Evaluation.LockAsync(db, place, cancellationToken);
        var now = clock.GetCurrentInstant();
        var before = await db.FollowUpSteps.AsNoTracking().Where(s => s.UnitId == place.UnitId && s.FollowUpId == followUpId).ToListAsync(cancellationToken);
        if (before.Find(s => s.Id == step.Id) is { } same)
        {
            return same.Step == step.Step ? Result<FollowUpStep>.Of(step.Step) : Refusals.IdUsed<FollowUpStep>();
        }

        if (before.Exists(s => s.Step != FollowUpStep.Reassigned))
        {
            return Result<FollowUpStep>.Refused(Refusal.Conflict, "", "follow-up.closed", "The follow-up was closed already.");
        }

        db.FollowUpSteps.Add(new FollowUpStepRow
        {
            UnitId = place.UnitId, Id = step.Id, FollowUpId = followUpId, Step = step.Step, At = now, By = actor.Name, Reason = step.Reason, ForRole = step.ForRole,
        });
        AuditTrail.Add(db, place.UnitId, now, actor, "follow-up", followUpId, step.Step.ToString());
        await db.SaveChangesAsync(cancellationToken);
        await ReevaluateAsync(db, place, episode, now, cancellationToken);
        return Result<FollowUpStep>.Of(step.Step);
    }

    private static async Task ReevaluateAsync(UnitVentDbContext db, Place place, EpisodeRow episode, Instant now, CancellationToken cancellationToken)
    {
        var window = await WindowLoader.OfEpisodeAsync(db, place, now, cancellationToken) ?? throw new InvalidOperationException("A locked episode has a window.");
        await Evaluation.CarryOnAsync(db, episode, PatientPicture.At(window, now), Evaluation.Program, cancellationToken);
        await db.SaveChangesAsync(cancellationToken);
        await Notices.SendAsync(db, place.UnitId, cancellationToken);
    }

    private sealed record NewStep(Guid Id, FollowUpStep Step, string? Reason, string? ForRole);
}
