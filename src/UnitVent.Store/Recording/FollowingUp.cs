using Microsoft.EntityFrameworkCore;
using NodaTime;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Results;
using UnitVent.Store.Auditing;
using UnitVent.Store.Model;
using UnitVent.Store.People;
using UnitVent.Store.Schema;

namespace UnitVent.Store.Recording;

/// <summary>Keeps what became of a follow-up.</summary>
internal static class FollowingUp
{
    public static async Task<Result<FollowUpStep>> StepAsync(UnitVentDbContext db, Place place, Actor actor, Step step, CancellationToken cancellationToken)
    {
        var episode = await Evaluation.LockAsync(db, place, cancellationToken);
        var before = await db.FollowUpSteps.AsNoTracking().Where(s => s.UnitId == place.UnitId && s.FollowUpId == step.FollowUpId).ToListAsync(cancellationToken);
        if (before.Find(s => s.Id == step.Id) is { } same)
        {
            return (same.Step, same.Reason, same.ForRole) == (step.Kind, step.Reason, step.ForRole) ? Result<FollowUpStep>.Of(step.Kind) : Refusals.IdUsed<FollowUpStep>();
        }

        if (before.Exists(s => s.Step != FollowUpStep.Reassigned))
        {
            return Result<FollowUpStep>.Refused(Refusal.Conflict, "", "follow-up.closed", "The follow-up was closed already.");
        }

        db.FollowUpSteps.Add(new FollowUpStepRow
        {
            UnitId = place.UnitId,
            Id = step.Id,
            FollowUpId = step.FollowUpId,
            Step = step.Kind,
            At = step.Now,
            By = actor.Name,
            Reason = step.Reason,
            ForRole = step.ForRole,
        });
        AuditTrail.Add(db, place.UnitId, step.Now, actor, "follow-up", step.FollowUpId, step.Kind.ToString());
        await db.SaveChangesAsync(cancellationToken);
        await Evaluation.AgainAsync(db, place, episode, step.Now, cancellationToken);
        return Result<FollowUpStep>.Of(step.Kind);
    }

    internal sealed record Step(Guid Id, Guid FollowUpId, FollowUpStep Kind, string? Reason, string? ForRole, Instant Now);
}
