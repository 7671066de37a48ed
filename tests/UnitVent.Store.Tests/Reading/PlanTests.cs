using Microsoft.EntityFrameworkCore;
using NodaTime;
using Npgsql;
using UnitVent.Charting.Windows;
using UnitVent.Store.Reading;
using UnitVent.Store.Schema;

namespace UnitVent.Store.Tests.Reading;

/// <summary>The one query that every board and page rests on keeps its plan.</summary>
public sealed class PlanTests(TestStore store) : IClassFixture<TestStore>
{
    [Fact]
    public async Task WindowQuery_ReadsEntriesByTheirIndex()
    {
        var episode = await store.AdmitAsync("1");
        await Sql.TellAsync(
            store.Runtime,
            $"""
            insert into entry (unit_id, id, episode_id, kind, effective_at, recorded_at, recorded_by, confirmed, body)
            select '{store.UnitId}', gen_random_uuid(), '{episode}', 'VentilatorCheck', now() - i * interval '10 min', now(), 'T', array[]::text[], '{"{}"}'
            from generate_series(1, 20000) i
            """,
            store.UnitId);
        await Sql.TellAsync(store.Owner, "analyze");
        var plan = await PlanAsync(episode);

        Assert.Contains("ix_entry_unit_id_episode_id_effective_at_sequence", plan);
        Assert.Contains("ix_entry_unit_id_episode_id_kind_effective_at_sequence", plan);
        Assert.DoesNotContain("Seq Scan on entry", plan);
    }

    private async Task<string> PlanAsync(Guid episode)
    {
        await using var db = await store.Get<IDbContextFactory<UnitVentDbContext>>().CreateDbContextAsync(TestStore.Cancel);
        await using var transaction = await db.Database.BeginTransactionAsync(TestStore.Cancel);
        await db.Database.ExecuteSqlAsync($"select set_config('unitvent.unit', {store.UnitId.ToString()}, true)", TestStore.Cancel);
        var now = SystemTime();
        await using var command = (NpgsqlCommand)db.Database.GetDbConnection().CreateCommand();
        command.CommandText = "explain " + System.Text.RegularExpressions.Regex.Replace(WindowLoader.EntriesSql, @"\{(\d)\}", m => "$" + (m.Groups[1].Value[0] - '0' + 1));
        command.Parameters.Add(new() { Value = store.UnitId });
        command.Parameters.Add(new() { Value = new[] { episode } });
        command.Parameters.Add(new() { Value = now - ChartWindow.Span });
        command.Parameters.Add(new() { Value = now });
        await using var reader = await command.ExecuteReaderAsync(TestStore.Cancel);
        var lines = new List<string>();
        while (await reader.ReadAsync(TestStore.Cancel))
        {
            lines.Add(reader.GetString(0));
        }

        return string.Join('\n', lines);
    }

    private static Instant SystemTime() => SystemClock.Instance.GetCurrentInstant();
}
