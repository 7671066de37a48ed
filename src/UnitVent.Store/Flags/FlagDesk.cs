using System.Text.Json;
using Microsoft.EntityFrameworkCore;
using NodaTime;
using UnitVent.Charting.Fields;
using UnitVent.Charting.Flags;
using UnitVent.Charting.Results;
using UnitVent.Charting.Rules;
using UnitVent.Store.Auditing;
using UnitVent.Store.Live;
using UnitVent.Store.Model;
using UnitVent.Store.People;
using UnitVent.Store.Recording;

namespace UnitVent.Store.Flags;

/// <summary>Takes flags in hand.</summary>
public sealed class FlagDesk
{
    private static readonly Duration UrgentAtMost = Duration.FromHours(1);
    private static readonly Duration OtherAtMost = Duration.FromHours(12);

    private readonly UnitScope scope;
    private readonly IClock clock;

    internal FlagDesk(UnitScope scope, IClock clock) => (this.scope, this.clock) = (scope, clock);

    /// <summary>Says that somebody has a flag in hand. It clears nothing; the flag is open again when the time is over or a worse value comes.</summary>
    /// <param name="actor">Who.</param>
    /// <param name="flagId">The flag.</param>
    /// <param name="id">Made by the caller; the same id again is done once.</param>
    /// <param name="plan">What is planned; null for a bare "seen, acting".</param>
    /// <param name="until">Until when; null for an hour. An urgent flag is in hand for an hour at most, others for twelve.</param>
    /// <param name="toldWho">Who was told.</param>
    /// <param name="toldAt">When.</param>
    /// <param name="cancellationToken">Gives up.</param>
    /// <param name="takeOver">Whether it is taken over from somebody who has it in hand; without it the second of two is told who was first.</param>
    public Task<Result<Flag>> AcknowledgeAsync(
        Actor actor, Guid flagId, Guid id, string? plan, Instant? until, string? toldWho, Instant? toldAt, CancellationToken cancellationToken, bool takeOver = false) =>
        scope.WithAsync(
            actor,
            flagId,
            "flag",
            Operation.Acknowledge,
            async (db, place) =>
            {
                var episode = await Evaluation.LockAsync(db, place, cancellationToken);
                var row = await db.Flags.FirstAsync(f => f.UnitId == place.UnitId && f.Id == flagId, cancellationToken);
                if (await db.FlagEvents.AsNoTracking().FirstOrDefaultAsync(e => e.UnitId == place.UnitId && e.Id == id, cancellationToken) is { } before)
                {
                    return before.FlagId == flagId && IsSame(before, plan, until, toldWho, toldAt) ? Result<Flag>.Of(row.ToFlag()) : Refusals.IdUsed<Flag>();
                }

                var (now, flag) = (clock.GetCurrentInstant(), row.ToFlag());
                if ((Refused(flag, until, now) ?? (takeOver ? null : TakenBy(flag, actor, now))) is { } refused)
                {
                    return refused;
                }

                var hand = new Acknowledgement(now, actor.Name, plan, until ?? now + UrgentAtMost, toldWho, toldAt);
                row.Take(flag with { InHand = hand });
                var happened = Evaluation.EventOf(row, FlagStepKind.Acknowledged, now, actor.Name);
                happened.Id = id;
                db.FlagEvents.Add(happened);
                episode.NextEvaluationAt = episode.NextEvaluationAt is { } next ? Instant.Min(next, hand.Until) : hand.Until;
                AuditTrail.Add(db, place.UnitId, now, actor, "acknowledge", flagId, flag.Finding.Rule);
                await db.SaveChangesAsync(cancellationToken);
                await Notices.SendAsync(db, place.UnitId, cancellationToken);
                return Result<Flag>.Of(row.ToFlag());
            },
            cancellationToken);

    private static bool IsSame(FlagEventRow before, string? plan, Instant? until, string? toldWho, Instant? toldAt) =>
        before is { Kind: FlagStepKind.Acknowledged, InHand: { } text }
        && JsonSerializer.Deserialize<Acknowledgement>(text, ChartJson.Options)! is var hand
        && (hand.Plan, hand.ToldWho, hand.ToldAt) == (plan, toldWho, toldAt)
        && hand.Until == (until ?? hand.At + UrgentAtMost);

    private static Result<Flag>? TakenBy(Flag flag, Actor actor, Instant now) =>
        flag.InHand is { } hand && hand.Until > now && hand.By != actor.Name
            ? Result<Flag>.Refused(Refusal.Conflict, "", "flag.inHand", $"{hand.By} took it in hand {(now - hand.At).TotalMinutes:0} min ago.")
            : null;

    private static Result<Flag>? Refused(Flag flag, Instant? until, Instant now)
    {
        var atMost = flag.Finding.Severity == Severity.Urgent ? UrgentAtMost : OtherAtMost;
        return flag.State != FlagState.Open ? Result<Flag>.Refused(Refusal.Conflict, "", "flag.closed", "The flag is closed.")
            : until <= now ? Result<Flag>.Refused(Refusal.Value, "until", "time.order", "The time until which it is in hand has passed.")
            : until > now + atMost ? Result<Flag>.Refused(Refusal.Value, "until", "limit", $"In hand for {atMost.TotalHours:0} h at most at this level.")
            : null;
    }
}
