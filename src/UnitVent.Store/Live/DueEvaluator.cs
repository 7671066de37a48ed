using Microsoft.EntityFrameworkCore;
using Microsoft.Extensions.Hosting;
using Microsoft.Extensions.Logging;
using NodaTime;
using UnitVent.Charting.Flags;
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
    private const int AtOnce = 50; // charts in one transaction: few enough to hold no writer up
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
            foreach (var some in (due.Succeeded ? due.Value : []).Chunk(AtOnce))
            {
                evaluated += await TryAsync(unit, some, cancellationToken) ?? await OneByOneAsync(unit, some, cancellationToken);
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

    /// <summary>One chart that cannot be evaluated must not keep the others from it.</summary>
    private async Task<int> OneByOneAsync(Guid unitId, Guid[] episodes, CancellationToken cancellationToken)
    {
        var evaluated = 0;
        foreach (var episode in episodes.Length > 1 ? episodes : [])
        {
            evaluated += await TryAsync(unitId, [episode], cancellationToken) ?? 0;
        }

        return evaluated;
    }

    /// <returns>How many were evaluated; null when it broke off.</returns>
    private async Task<int?> TryAsync(Guid unitId, Guid[] episodes, CancellationToken cancellationToken)
    {
        try
        {
            var done = await scope.WithinAsync(unitId, (db, place) => EvaluateAsync(db, place.UnitId, episodes, cancellationToken), cancellationToken);
            return done.Succeeded ? done.Value : 0;
        }
#pragma warning disable CA1031 // Whatever a chart holds, the pass goes on.
        catch (Exception e) when (e is not OperationCanceledException)
#pragma warning restore CA1031
        {
            log.LogError("Episodes {Episodes} could not be evaluated: {Error}", string.Join(", ", episodes), e.GetType().Name);
            return null;
        }
    }

    private async Task<Result<int>> EvaluateAsync(UnitVentDbContext db, Guid unitId, Guid[] episodes, CancellationToken cancellationToken)
    {
        var mine = await db.Database.SqlQuery<bool>($"select pg_try_advisory_xact_lock({LeaseKey}) as \"Value\"").FirstAsync(cancellationToken);
        if (!mine)
        {
            return Result<int>.Of(0);
        }

        // A chart that somebody is writing to is evaluated by that somebody.
        var heads = await db.Episodes
            .FromSql($"select * from episode where unit_id = {unitId} and id = any ({episodes}) and ended_at is null for update skip locked")
            .ToDictionaryAsync(e => e.Id, cancellationToken);
        var now = clock.GetCurrentInstant();
        var due = heads.Values.Where(e => e.NextEvaluationAt <= now).Select(e => e.Id).ToArray();
        var flags = (await db.Flags.Where(f => f.UnitId == unitId && due.Contains(f.EpisodeId) && f.State == FlagState.Open).ToListAsync(cancellationToken)).ToLookup(f => f.EpisodeId);
        foreach (var window in await WindowLoader.OfEpisodesAsync(db, unitId, due, now, cancellationToken))
        {
            Evaluation.CarryOn(db, heads[window.Episode.Id], PatientPicture.At(window, now), [.. flags[window.Episode.Id]]);
        }

        await db.SaveChangesAsync(cancellationToken);
        await Notices.SendAsync(db, unitId, cancellationToken);
        return Result<int>.Of(due.Length);
    }
}
