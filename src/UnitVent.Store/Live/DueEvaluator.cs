using Microsoft.EntityFrameworkCore;
using Microsoft.Extensions.Hosting;
using Microsoft.Extensions.Logging;
using NodaTime;
using UnitVent.Charting.Results;
using UnitVent.Store.Recording;
using UnitVent.Store.Schema;

namespace UnitVent.Store.Live;

/// <summary>Looks again at episodes that time alone changed: a check fell due, a gas grew too old, an acknowledgement is over. On one node only.</summary>
internal sealed class DueEvaluator(UnitScope scope, IClock clock, ILogger<DueEvaluator> log) : BackgroundService
{
    private const long LeaseKey = 0x556E697444756520; // "UnitDue "
    private static readonly TimeSpan Pause = TimeSpan.FromSeconds(2);

    /// <summary>Evaluates every episode that is due.</summary>
    /// <returns>How many were.</returns>
    internal async Task<int> EvaluateDueAsync(CancellationToken cancellationToken)
    {
        var units = await scope.OutsideAsync(async db => Result<List<Guid>>.Of(await db.Units.AsNoTracking().Select(u => u.Id).ToListAsync(cancellationToken)), cancellationToken);
        var evaluated = 0;
        foreach (var unit in units.Succeeded ? units.Value : [])
        {
            var due = await scope.WithinAsync(unit, (db, place) => DueAsync(db, place.UnitId, cancellationToken), cancellationToken);
            foreach (var episode in due.Succeeded ? due.Value : [])
            {
                evaluated += await TryAsync(unit, episode, cancellationToken) ? 1 : 0;
            }
        }

        return evaluated;
    }

    /// <inheritdoc/>
    protected override async Task ExecuteAsync(CancellationToken stoppingToken)
    {
        while (!stoppingToken.IsCancellationRequested)
        {
            await Task.Delay(Pause, stoppingToken).ConfigureAwait(ConfigureAwaitOptions.SuppressThrowing);
            try
            {
                await EvaluateDueAsync(stoppingToken);
            }
            catch (OperationCanceledException) when (stoppingToken.IsCancellationRequested)
            {
                return;
            }
        }
    }

    private async Task<Result<List<Guid>>> DueAsync(UnitVentDbContext db, Guid unitId, CancellationToken cancellationToken)
    {
        var now = clock.GetCurrentInstant();
        return Result<List<Guid>>.Of(await db.Episodes.AsNoTracking()
            .Where(e => e.UnitId == unitId && e.EndedAt == null && e.NextEvaluationAt <= now)
            .Select(e => e.Id)
            .ToListAsync(cancellationToken));
    }

    private async Task<bool> TryAsync(Guid unitId, Guid episodeId, CancellationToken cancellationToken)
    {
        try
        {
            var done = await scope.WithinAsync(unitId, (db, _) => EvaluateAsync(db, new Place(unitId, episodeId), cancellationToken), cancellationToken);
            return done is { Succeeded: true, Value: true };
        }
#pragma warning disable CA1031 // One chart that cannot be evaluated must not keep the others from it.
        catch (Exception e) when (e is not OperationCanceledException)
#pragma warning restore CA1031
        {
            log.LogError("Episode {Episode} could not be evaluated: {Error}", episodeId, e.GetType().Name);
            return false;
        }
    }

    private async Task<Result<bool>> EvaluateAsync(UnitVentDbContext db, Place place, CancellationToken cancellationToken)
    {
        var mine = await db.Database.SqlQuery<bool>($"select pg_try_advisory_xact_lock({LeaseKey}) as \"Value\"").FirstAsync(cancellationToken);
        if (!mine)
        {
            return Result<bool>.Of(false);
        }

        var episode = await Evaluation.LockAsync(db, place, cancellationToken);
        var now = clock.GetCurrentInstant();
        if (episode.EndedAt is not null || !(episode.NextEvaluationAt <= now))
        {
            return Result<bool>.Of(false);
        }

        await Evaluation.AgainAsync(db, place, episode, now, cancellationToken);
        return Result<bool>.Of(true);
    }
}
