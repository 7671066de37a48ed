using Microsoft.EntityFrameworkCore;
using UnitVent.Store.Schema;

namespace UnitVent.Store;

/// <summary>Brings a database to the shape that this program needs.</summary>
public static class StoreMigrations
{
    private const long LockKey = 0x556E697456656E74; // "UnitVent"

    /// <summary>Migrates under an advisory lock and grants the run-time role what it needs. Two programs at once are safe.</summary>
    /// <param name="ownerConnectionString">A way in as the role that owns the schema.</param>
    /// <param name="runtimeRole">The role that the program runs as; it must exist.</param>
    /// <param name="cancellationToken">Gives up.</param>
    public static async Task MigrateAsync(string ownerConnectionString, string runtimeRole, CancellationToken cancellationToken)
    {
        await using var source = ContextOptions.DataSource(ownerConnectionString);
        await using var holder = await source.OpenConnectionAsync(cancellationToken);
        await using (var take = holder.CreateCommand())
        {
            take.CommandText = $"select pg_advisory_lock({LockKey})";
            await take.ExecuteNonQueryAsync(cancellationToken);
        }

        var options = new DbContextOptionsBuilder<UnitVentDbContext>();
        ContextOptions.Configure(options, source);
        await using var db = new UnitVentDbContext(options.Options);
        await db.Database.MigrateAsync(cancellationToken);
        await using var grant = holder.CreateCommand();
        grant.CommandText = SchemaSql.GrantsTo(runtimeRole);
        await grant.ExecuteNonQueryAsync(cancellationToken);
    }
}
