using NodaTime;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Results;
using UnitVent.Store.People;

namespace UnitVent.Store.Recording;

/// <summary>The only writer of charts. One call is one transaction: all of it is recorded, or nothing.</summary>
public sealed class ChartRecorder
{
    private readonly UnitScope scope;
    private readonly IClock clock;

    internal ChartRecorder(UnitScope scope, IClock clock) => (this.scope, this.clock) = (scope, clock);

    /// <summary>Records entries, or says everything that speaks against them. Entries that had been recorded before are answered, not repeated.</summary>
    /// <param name="actor">Who records.</param>
    /// <param name="episodeId">The episode.</param>
    /// <param name="entries">The entries of one round, in order; the field names of errors are prefixed with <c>entries[i].</c> when there are several.</param>
    /// <param name="cancellationToken">Gives up.</param>
    public Task<Result<RecordReceipt>> RecordAsync(Actor actor, Guid episodeId, IReadOnlyList<NewEntry> entries, CancellationToken cancellationToken) =>
        entries.Count == 0 ? Task.FromResult(Refusals.Missing<RecordReceipt>("entries", "An entry is needed."))
        : entries.DistinctBy(e => e.Id).Count() < entries.Count ? Task.FromResult(Refusals.IdUsed<RecordReceipt>())
        : scope.WithAsync(
            actor,
            episodeId,
            "episode",
            Operation.Read,
            (db, place) => entries.Any(e => !actor.May(Permissions.ToRecord(e.Body.Kind), place.UnitId))
                ? Task.FromResult(Refusals.Denied<RecordReceipt>())
                : RecordingEntries.RecordAsync(db, place, actor, [.. entries], clock.GetCurrentInstant(), cancellationToken),
            cancellationToken);

    /// <summary>Strikes out an entry: it stays in the chart, marked, and counts no longer.</summary>
    /// <param name="actor">Who strikes out; what somebody else charted only as charge therapist or physician.</param>
    /// <param name="episodeId">The episode.</param>
    /// <param name="entryId">The entry.</param>
    /// <param name="strikeId">Made by the caller; the same id again is done once.</param>
    /// <param name="reason">Why; needed.</param>
    /// <param name="cancellationToken">Gives up.</param>
    public Task<Result<ChartEntry>> StrikeOutAsync(
        Actor actor, Guid episodeId, Guid entryId, Guid strikeId, string reason, CancellationToken cancellationToken) =>
        string.IsNullOrWhiteSpace(reason)
            ? Task.FromResult(Refusals.NeedsReason<ChartEntry>())
            : scope.WithAsync(
                actor,
                episodeId,
                "episode",
                Operation.Chart,
                (db, place) => StrikingOut.StrikeAsync(db, place, actor, entryId, new(strikeId, reason, clock.GetCurrentInstant()), cancellationToken),
                cancellationToken);

    /// <summary>Says what became of a follow-up.</summary>
    /// <param name="actor">Who says so.</param>
    /// <param name="followUpId">The follow-up.</param>
    /// <param name="stepId">Made by the caller; the same id again is done once.</param>
    /// <param name="step">What became of it. Done and cancelled close it.</param>
    /// <param name="reason">Why, in words.</param>
    /// <param name="forRole">To whom it was given; needed for reassigned, else null.</param>
    /// <param name="cancellationToken">Gives up.</param>
    public Task<Result<FollowUpStep>> FollowUpStepAsync(
        Actor actor, Guid followUpId, Guid stepId, FollowUpStep step, string? reason, string? forRole, CancellationToken cancellationToken) =>
        step == FollowUpStep.Reassigned && string.IsNullOrWhiteSpace(forRole)
            ? Task.FromResult(Refusals.Missing<FollowUpStep>("forRole", "The role that is to do it now is needed."))
            : scope.WithAsync(
                actor,
                followUpId,
                "follow-up",
                Operation.Chart,
                (db, place) => FollowingUp.StepAsync(db, place, actor, new(stepId, followUpId, step, reason, forRole, clock.GetCurrentInstant()), cancellationToken),
                cancellationToken);
}
