using Microsoft.EntityFrameworkCore;
using NodaTime;
using UnitVent.Charting.Results;
using UnitVent.Store.Model;
using UnitVent.Store.People;
using UnitVent.Store.Schema;

namespace UnitVent.Store.Auditing;

/// <summary>Who did what to whom and when, in a chain of hashes a unit. It carries ids and kinds, never values.</summary>
public sealed class AuditTrail
{
    private readonly UnitScope scope;
    private readonly IClock clock;

    internal AuditTrail(UnitScope scope, IClock clock) => (this.scope, this.clock) = (scope, clock);

    /// <summary>Gets the chain of what belongs to no unit: sign-ins, administration.</summary>
    public static Guid Everywhere { get; } = Guid.Empty;

    /// <summary>Appends an event.</summary>
    /// <param name="unitId">The unit's chain; <see cref="Everywhere"/> for what belongs to none.</param>
    /// <param name="who">Who did it, by name.</param>
    /// <param name="what">What was done, for example <c>sign-in</c>.</param>
    /// <param name="subject">To which episode, entry, flag or person.</param>
    /// <param name="detail">Kinds and codes; no values, no patient's name.</param>
    /// <param name="cancellationToken">Gives up.</param>
    /// <returns>Refused when the store did not answer.</returns>
    public Task<Result<bool>> AppendAsync(Guid unitId, string who, string what, Guid? subject, string detail, CancellationToken cancellationToken) =>
        scope.WithinAsync(
            unitId,
            async (db, place) =>
            {
                Add(db, place.UnitId, clock.GetCurrentInstant(), who, what, subject, detail);
                await db.SaveChangesAsync(cancellationToken);
                return Result<bool>.Of(true);
            },
            cancellationToken);

    /// <summary>Recomputes a unit's chain.</summary>
    /// <returns>The number of the first row that does not follow from the one before it; null when the chain holds.</returns>
    public Task<Result<long?>> VerifyAsync(Guid unitId, CancellationToken cancellationToken) =>
        scope.WithinAsync(
            unitId,
            async (db, _) => Result<long?>.Of(await db.Database
                .SqlQuery<long?>($"select (select number from audit_first_bad()) as \"Value\"")
                .FirstAsync(cancellationToken)),
            cancellationToken);

    /// <summary>The newest events of a unit, newest first.</summary>
    public Task<Result<IReadOnlyList<AuditEvent>>> NewestAsync(Guid unitId, int count, CancellationToken cancellationToken) =>
        scope.WithinAsync(
            unitId,
            async (db, place) => Result<IReadOnlyList<AuditEvent>>.Of(await db.AuditEvents.AsNoTracking()
                .Where(e => e.UnitId == place.UnitId)
                .OrderByDescending(e => e.Number)
                .Take(count)
                .Select(e => new AuditEvent(e.Number, e.At, e.Who, e.What, e.Subject, e.Detail))
                .ToListAsync(cancellationToken)),
            cancellationToken);

    internal static void Add(UnitVentDbContext db, Guid unitId, Instant at, string who, string what, Guid? subject, string detail) =>
        db.AuditEvents.Add(new AuditEventRow { UnitId = unitId, At = at, Who = who, What = what, Subject = subject, Detail = detail });

    internal static void Add(UnitVentDbContext db, Guid unitId, Instant at, Actor actor, string what, Guid? subject, string detail) =>
        Add(db, unitId, at, actor.Name, what, subject, detail);
}
