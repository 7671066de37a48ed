using Npgsql;
using UnitVent.Store.Tests.Cluster;
using UnitVent.Testing;

namespace UnitVent.Store.Tests;

public sealed class TestDatabaseTests
{
    [Fact]
    public async Task Create_First_IsMigratedAndEmpty()
    {
        await using var database = await TestDatabase.CreateAsync();

        Assert.Equal(0, await ClusterSandbox.AskAsync<long>(database.OwnerConnectionString, "select count(*) from entry"));
    }

    [Fact]
    public async Task Create_Twice_GivesDatabasesThatDoNotSeeEachOther()
    {
        await using var first = await TestDatabase.CreateAsync();
        await using var second = await TestDatabase.CreateAsync();
        await ClusterSandbox.TellAsync(first.OwnerConnectionString, "create table here (id int); grant select on here to unitvent_runtime");

        Assert.Equal(0, await ClusterSandbox.AskAsync<long>(first.RuntimeConnectionString, "select count(*) from here"));
        var refusal = await Assert.ThrowsAsync<PostgresException>(
            () => ClusterSandbox.AskAsync<long>(second.RuntimeConnectionString, "select count(*) from here"));
        Assert.Equal(PostgresErrorCodes.UndefinedTable, refusal.SqlState);
    }

    [Fact]
    public async Task Dispose_WithConnectionsOpen_DropsTheDatabase()
    {
        var database = await TestDatabase.CreateAsync();
        await using var forgotten = new NpgsqlConnection(database.RuntimeConnectionString);
        await forgotten.OpenAsync(TestContext.Current.CancellationToken);

        await database.DisposeAsync();

        var refusal = await Assert.ThrowsAsync<PostgresException>(
            () => ClusterSandbox.AskAsync<int>(database.OwnerConnectionString, "select 1"));
        Assert.Equal(PostgresErrorCodes.InvalidCatalogName, refusal.SqlState);
    }
}
