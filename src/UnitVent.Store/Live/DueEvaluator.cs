using Microsoft.EntityFrameworkCore;
using Microsoft.Extensions.Hosting;
using Microsoft.Extensions.Logging;
using NodaTime;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Results;
using UnitVent.Store.Reading;
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
            var done = await scope.WithinAsync(unit, (db, place) => OfUnitAsync(db, place.UnitId, cancellationToken), cancellationToken);
            evaluated += done.Succeeded ? done.Value : 0;
        }

        return evaluated;
    }

    /// <inheritdoc/>
    protected override async Task ExecuteAsync(CancellationToken stoppingToken)
    {
        while (!stoppingToken.IsCancellationRequested)
        {
            await Task.Delay(Pause, stoppingToken).ConfigureAwait(ConfigureAwaitOptions.SuppressThrowing);
            if (stoppingToken.IsCancellationRequested)
            {
                return;
            }

            try
            {
                await EvaluateDueAsync(stoppingToken);
            }
            catch (Exception e) when (e is DbUpdateException or InvalidOperationException or OperationCanceledException)
            {
                log.LogWarning("An evaluation failed and is tried again: {Error}", e.GetType().Name);
            }
        }
    }

    private async Task<Result<int>> OfUnitAsync(UnitVentDbContext db, Guid unitId, CancellationToken cancellationToken)
    {
        var mine = await db.Database.SqlQuery<bool>($"select pg_try_advisory_xact_lock({LeaseKey}) as \"Value\"").FirstAsync(cancellationToken);
        if (!mine)
        {
            return Result<int>.Of(0);
        }

        var now = clock.GetCurrentInstant();
        var due = await db.Episodes.AsNoTracking()
            .Where(e => e.UnitId == unitId && e.EndedAt == null && e.NextEvaluationAt <= now)
            .Select(e => e.Id)
            .ToListAsync(cancellationToken);
        foreach (var id in due)
        {
            var place = new Place(unitId, id);
            var episode = await Evaluation.LockAsync(db, place, cancellationToken);
            if (await WindowLoader.OfEpisodeAsync(db, place, now, cancellationToken) is { } window)
            {
                await Evaluation.CarryOnAsync(db, episode, PatientPicture.At(window, now), Evaluation.Program, cancellationToken);
                await db.SaveChangesAsync(cancellationToken);
            }
        }

        if (due.Count > 0)
        {
            await Notices.SendAsync(db, unitId, cancellationToken);
        }

        return Result<int>.Of(due.Count);
    }
}
