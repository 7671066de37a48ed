using System.Net.Sockets;
using Microsoft.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore.Storage;
using Npgsql;
using UnitVent.Charting.Results;
using UnitVent.Store.People;
using UnitVent.Store.Schema;

namespace UnitVent.Store;

/// <summary>The one place where a unit's data is reached: checks the membership, opens a transaction, names the unit to the database.</summary>
internal sealed class UnitScope(IDbContextFactory<UnitVentDbContext> contexts)
{
    // PostgreSQL, appendix A: connection, rolled back, out of resources, not in a state for it, operator, system, internal.
    private static readonly HashSet<string> ClassesOfTrouble = ["08", "40", "53", "55", "57", "58", "XX"];

    /// <summary>Finds what an id belongs to and works in its unit. Another unit's id answers as if absent.</summary>
    public Task<Result<T>> WithAsync<T>(
        Actor actor, Guid id, string what, Operation operation, Func<UnitVentDbContext, Place, Task<Result<T>>> work, CancellationToken cancellationToken) =>
        SettledAsync(async () =>
        {
            await using var db = await contexts.CreateDbContextAsync(cancellationToken);
            var found = await db.UnitLookups.AsNoTracking().FirstOrDefaultAsync(l => l.Id == id, cancellationToken);
            return found is null || !actor.May(Operation.Read, found.UnitId) ? Refusals.NotFound<T>(what)
                : !actor.May(operation, found.UnitId) ? Refusals.Denied<T>()
                : await InTransactionAsync(db, new Place(found.UnitId, found.EpisodeId), work, cancellationToken);
        });

    /// <summary>Works in the unit with a code. A unit that the actor may not see answers as if absent.</summary>
    public Task<Result<T>> WithUnitAsync<T>(
        Actor actor, string code, Operation operation, Func<UnitVentDbContext, Place, Task<Result<T>>> work, CancellationToken cancellationToken) =>
        SettledAsync(async () =>
        {
            await using var db = await contexts.CreateDbContextAsync(cancellationToken);
            var unit = await db.Units.AsNoTracking().Where(u => u.Code == code).Select(u => (Guid?)u.Id).FirstOrDefaultAsync(cancellationToken);
            return unit is not { } id || !actor.May(Operation.Read, id) ? Refusals.NotFound<T>("unit")
                : !actor.May(operation, id) ? Refusals.Denied<T>()
                : await InTransactionAsync(db, new Place(id, Guid.Empty), work, cancellationToken);
        });

    /// <summary>Works in a unit for the program itself: evaluation, boards.</summary>
    public Task<Result<T>> WithinAsync<T>(Guid unitId, Func<UnitVentDbContext, Place, Task<Result<T>>> work, CancellationToken cancellationToken) =>
        GuardedAsync(async () =>
        {
            await using var db = await contexts.CreateDbContextAsync(cancellationToken);
            return await InTransactionAsync(db, new Place(unitId, Guid.Empty), work, cancellationToken);
        });

    /// <summary>Works outside any unit: people, tokens, set-up.</summary>
    public Task<Result<T>> OutsideAsync<T>(Func<UnitVentDbContext, Task<Result<T>>> work, CancellationToken cancellationToken) =>
        GuardedAsync(async () =>
        {
            await using var db = await contexts.CreateDbContextAsync(cancellationToken);
            return await InTransactionAsync(db, new Place(Guid.Empty, Guid.Empty), (context, _) => work(context), cancellationToken);
        });

    /// <summary>Runs something that reaches the store; a store that does not answer is a refusal, not an exception.</summary>
    public static async Task<Result<T>> GuardedAsync<T>(Func<Task<Result<T>>> work)
    {
        try
        {
            return await work();
        }
        catch (CommitLostException)
        {
            return Refusals.OutcomeUnknown<T>();
        }
        catch (DbUpdateConcurrencyException)
        {
            return Refusals.ChangedMeanwhile<T>();
        }
        catch (DbUpdateException e) when (UniqueViolation.Is(e))
        {
            return Refusals.IdUsed<T>();
        }
        catch (Exception e) when (IsUnavailable(e))
        {
            return Refusals.Unavailable<T>();
        }
    }

    // Whether a commit took cannot be told when its answer is lost. Everything in a unit carries an id of its caller's, so it is
    // looked for once more: what had been saved is found again, what had not is saved now.
    private static Task<Result<T>> SettledAsync<T>(Func<Task<Result<T>>> work) => GuardedAsync(async () =>
    {
        try
        {
            return await work();
        }
        catch (CommitLostException)
        {
            var again = await GuardedAsync(work);
            return again.Refusal == Refusal.Unavailable ? Refusals.OutcomeUnknown<T>() : again;
        }
    });

    private static async Task<Result<T>> InTransactionAsync<T>(
        UnitVentDbContext db, Place place, Func<UnitVentDbContext, Place, Task<Result<T>>> work, CancellationToken cancellationToken)
    {
        await using var transaction = await db.Database.BeginTransactionAsync(cancellationToken);
        await NameUnitAsync(db, place.UnitId, cancellationToken);
        var result = await work(db, place);
        if (result.Succeeded)
        {
            await CommitAsync(transaction);
        }

        return result;
    }

    /// <summary>Names the unit to row-level security until the transaction ends.</summary>
    public static Task NameUnitAsync(UnitVentDbContext db, Guid unitId, CancellationToken cancellationToken) =>
        db.Database.ExecuteSqlAsync($"select set_config('unitvent.unit', {unitId.ToString()}, true)", cancellationToken);

    /// <summary>Commits. Nobody gives up half-way: the outcome would be unknown.</summary>
    /// <exception cref="CommitLostException">The answer was lost.</exception>
    public static async Task CommitAsync(IDbContextTransaction transaction)
    {
        try
        {
            await transaction.CommitAsync(CancellationToken.None);
        }
        catch (Exception e) when (IsUnavailable(e))
        {
            throw new CommitLostException(e);
        }
    }

    // What ends the connection (FATAL), and the classes of errors that are nobody's doing who charts.
    private static bool IsUnavailable(Exception exception) => exception switch
    {
        PostgresException postgres => postgres.InvariantSeverity is "FATAL" or "PANIC"
            || postgres.SqlState == PostgresErrorCodes.ReadOnlySqlTransaction
            || ClassesOfTrouble.Contains(postgres.SqlState[..2]),
        NpgsqlException or TimeoutException or SocketException => true,
        DbUpdateException { InnerException: { } inner } => IsUnavailable(inner),
        InvalidOperationException { InnerException: { } inner } => IsUnavailable(inner),
        _ => false,
    };
}
