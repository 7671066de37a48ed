using Microsoft.EntityFrameworkCore;
using NodaTime;
using Npgsql;
using UnitVent.Store.Schema;
using UnitVent.Testing;
using UnitVent.Web.Hosting;

namespace UnitVent.Benchmarks;

/// <summary>The demonstration unit in a database of its own, for measuring its board.</summary>
internal sealed class DemoBoard : IAsyncDisposable
{
    private readonly TestDatabase database;
    private readonly NpgsqlDataSource source;

    private DemoBoard(TestDatabase database, NpgsqlDataSource source, UnitVentDbContext db, Guid unitId) =>
        (this.database, this.source, Db, UnitId) = (database, source, db, unitId);

    public UnitVentDbContext Db { get; }

    public Guid UnitId { get; }

    public Instant Now { get; } = SystemClock.Instance.GetCurrentInstant();

    public static async Task<DemoBoard> CreateAsync()
    {
        var database = await TestDatabase.CreateAsync();
        var settings = new HostSettings("", "", database.OwnerConnectionString, database.RuntimeConnectionString);
        await using (var opened = await Database.OpenAsync(settings, CancellationToken.None))
        {
            await DemoUnitLoad.RunAsync(opened, CancellationToken.None);
        }

        await using (var owner = new NpgsqlConnection(database.OwnerConnectionString))
        {
            await owner.OpenAsync();
            await using var analyse = new NpgsqlCommand("analyze", owner);
            await analyse.ExecuteNonQueryAsync();
        }

        var source = ContextOptions.DataSource(database.RuntimeConnectionString);
        var options = new DbContextOptionsBuilder<UnitVentDbContext>();
        ContextOptions.Configure(options, source);
        var db = new UnitVentDbContext(options.Options);
        var unitId = await db.Units.Where(u => u.Code == "DEMO").Select(u => u.Id).FirstAsync();
        await db.Database.OpenConnectionAsync();
        await db.Database.BeginTransactionAsync();
        await db.Database.ExecuteSqlAsync($"select set_config('unitvent.unit', {unitId.ToString()}, true)");
        return new(database, source, db, unitId);
    }

    public async ValueTask DisposeAsync()
    {
        await Db.DisposeAsync();
        await source.DisposeAsync();
        await database.DisposeAsync();
    }
}
