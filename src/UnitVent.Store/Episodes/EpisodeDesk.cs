using System.Text.Json;
using Microsoft.EntityFrameworkCore;
using NodaTime;
using UnitVent.Charting.Checking;
using UnitVent.Charting.Episodes;
using UnitVent.Charting.Fields;
using UnitVent.Charting.Results;
using UnitVent.Store.Live;
using UnitVent.Store.People;
using UnitVent.Store.Recording;
using UnitVent.Store.Schema;

namespace UnitVent.Store.Episodes;

/// <summary>Admits, moves, ends, reopens and cancels. The same id sent again is done once.</summary>
public sealed class EpisodeDesk
{
    private static readonly Duration ReopenWithin = Duration.FromHours(48);

    private readonly UnitScope scope;
    private readonly IClock clock;

    internal EpisodeDesk(UnitScope scope, IClock clock) => (this.scope, this.clock) = (scope, clock);

    /// <summary>Admits a patient to a bed and starts the episode.</summary>
    public Task<Result<AdmitReceipt>> AdmitAsync(Actor actor, string unitCode, Admission admission, CancellationToken cancellationToken) =>
        scope.WithUnitAsync(actor, unitCode, Operation.Admit, (db, place) => Admitting.AdmitAsync(db, place.UnitId, actor, admission, clock.GetCurrentInstant(), cancellationToken), cancellationToken);

    /// <summary>Moves the patient to another bed of the unit.</summary>
    public Task<Result<Guid>> MoveAsync(Actor actor, Guid episodeId, Guid id, string bed, CancellationToken cancellationToken) =>
        DoAsync(actor, episodeId, id, "move", bed, async step =>
        {
            if (step.Episode.EndedAt is not null)
            {
                return Refusals.Ended<Guid>();
            }

            await BedStays.LeaveAsync(step.Db, step.Episode, step.Now, cancellationToken);
            await step.Db.SaveChangesAsync(cancellationToken);
            return await BedStays.TakeAsync(step.Db, step.Episode, bed, step.Now, cancellationToken) ? step.Done() : Refusals.BedTaken<Guid>(bed);
        }, cancellationToken);

    /// <summary>Ends the episode; late entries are taken for another day.</summary>
    public Task<Result<Guid>> EndAsync(Actor actor, Guid episodeId, Guid id, Instant endedAt, Outcome outcome, CancellationToken cancellationToken) =>
        DoAsync(actor, episodeId, id, "end", $"{outcome} {endedAt}", async step =>
        {
            if (step.Episode.EndedAt is not null)
            {
                return Refusals.Ended<Guid>();
            }

            if (endedAt > step.Now + TimeCheck.Ahead || endedAt < step.Episode.AirwaySecuredAt)
            {
                return Result<Guid>.Refused(Refusal.Value, "endedAt", "time.order", "The end lies in the future, or before the airway was secured.");
            }

            var at = Instant.Min(endedAt, step.Now);
            await CloseAsync(step, at, outcome, cancellationToken);
            return step.Done(at);
        }, cancellationToken);

    /// <summary>Reopens an episode that ended within 48 h, in its last bed.</summary>
    public Task<Result<Guid>> ReopenAsync(Actor actor, Guid episodeId, Guid id, string reason, CancellationToken cancellationToken) =>
        string.IsNullOrWhiteSpace(reason) ? Task.FromResult(Refusals.NeedsReason<Guid>()) : DoAsync(actor, episodeId, id, "reopen", reason, async step =>
        {
            if (step.Episode.EndedAt is not { } ended || step.Now - ended > ReopenWithin)
            {
                return Result<Guid>.Refused(Refusal.Conflict, "", "episode.not-reopened", "Only an episode that ended within 48 h is reopened.");
            }

            (step.Episode.EndedAt, step.Episode.Outcome, step.Episode.NextEvaluationAt) = (null, null, step.Now);
            var bed = await BedStays.LastBedAsync(step.Db, step.Episode, cancellationToken);
            return await BedStays.TakeAsync(step.Db, step.Episode, bed, step.Now, cancellationToken) ? step.Done() : Refusals.BedTaken<Guid>(bed);
        }, cancellationToken);

    /// <summary>Cancels a wrong admission.</summary>
    public Task<Result<Guid>> CancelAsync(Actor actor, Guid episodeId, Guid id, string reason, CancellationToken cancellationToken) =>
        string.IsNullOrWhiteSpace(reason) ? Task.FromResult(Refusals.NeedsReason<Guid>()) : DoAsync(actor, episodeId, id, "cancel", reason, async step =>
        {
            if (step.Episode.EndedAt is not null)
            {
                return Refusals.Ended<Guid>();
            }

            await CloseAsync(step, step.Now, Outcome.CancelledInError, cancellationToken);
            return step.Done();
        }, cancellationToken);

    /// <summary>Corrects who the patient is; predicted body weight follows for the whole episode.</summary>
    public Task<Result<Guid>> CorrectPatientAsync(Actor actor, Guid episodeId, Guid id, PatientFacts patient, string reason, CancellationToken cancellationToken) =>
        string.IsNullOrWhiteSpace(reason) ? Task.FromResult(Refusals.NeedsReason<Guid>()) : DoAsync(
            actor, episodeId, id, "patient", JsonSerializer.Serialize(new { reason, patient }, ChartJson.Options), async step =>
        {
            var errors = AdmissionCheck.Facts(patient, step.Now).Where(e => !e.IsAsk).ToList();
            if (errors.Count > 0)
            {
                return Result<Guid>.Refused(Refusal.Value, errors);
            }

            var head = await step.Db.Patients.FirstAsync(p => p.UnitId == step.Episode.UnitId && p.Id == step.Episode.PatientId, cancellationToken);
            PatientHeads.Change(step.Db, head, patient, step.Now, actor, reason);
            step.Episode.NextEvaluationAt = step.Now;
            return step.Done();
        }, cancellationToken);

    private static async Task CloseAsync(DeskStep step, Instant at, Outcome outcome, CancellationToken cancellationToken)
    {
        (step.Episode.EndedAt, step.Episode.Outcome, step.Episode.NextEvaluationAt) = (at, outcome, null);
        await BedStays.LeaveAsync(step.Db, step.Episode, at, cancellationToken);
    }

    private Task<Result<Guid>> DoAsync(Actor actor, Guid episodeId, Guid id, string kind, string asked, Func<DeskStep, Task<Result<Guid>>> work, CancellationToken cancellationToken) =>
        scope.WithAsync(
            actor,
            episodeId,
            "episode",
            Operation.Admit,
            async (db, place) =>
            {
                var episode = await Evaluation.LockAsync(db, place, cancellationToken);
                var before = await db.EpisodeEvents.AsNoTracking().FirstOrDefaultAsync(e => e.UnitId == place.UnitId && e.Id == id, cancellationToken);
                return DeskStep.Before(before, episodeId, kind, asked)
                    ?? await SavedAsync(new DeskStep(db, episode, id, kind, asked, actor, clock.GetCurrentInstant()), work, cancellationToken);
            },
            cancellationToken);

    private static async Task<Result<Guid>> SavedAsync(DeskStep step, Func<DeskStep, Task<Result<Guid>>> work, CancellationToken cancellationToken)
    {
        try
        {
            var result = await work(step);
            if (result.Succeeded)
            {
                await step.Db.SaveChangesAsync(cancellationToken);
                await Notices.SendAsync(step.Db, step.Episode.UnitId, cancellationToken);
            }

            return result;
        }
        catch (DbUpdateException e) when (UniqueViolation.Is(e, BedStayConfiguration.OnePatientABed))
        {
            return Result<Guid>.Refused(Refusal.Conflict, "bed", "bed.taken", "The bed is taken.");
        }
        catch (DbUpdateException e) when (Admitting.IsPatientTwice(e))
        {
            return Refusals.PatientAdmitted<Guid>();
        }
    }
}
