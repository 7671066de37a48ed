using Microsoft.EntityFrameworkCore;
using Npgsql;

namespace UnitVent.Store.Schema;

/// <summary>How a context reaches its database.</summary>
internal static class ContextOptions
{
    private const int StatementsKeptPrepared = 100;

    public static NpgsqlDataSource DataSource(string connectionString)
    {
        var builder = new NpgsqlDataSourceBuilder(connectionString);
        builder.ConnectionStringBuilder.MaxAutoPrepare = StatementsKeptPrepared;
        builder.ConnectionStringBuilder.AutoPrepareMinUsages = 2;
        builder.UseNodaTime();
        return builder.Build();
    }

    public static DbContextOptionsBuilder Configure(DbContextOptionsBuilder builder, NpgsqlDataSource source) =>
        builder.UseNpgsql(source, npgsql => npgsql.UseNodaTime()).UseSnakeCaseNamingConvention();
}
