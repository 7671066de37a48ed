using Npgsql;
using UnitVent.Store;
using UnitVent.Store.Cluster;

namespace UnitVent.Testing;

/// <summary>The database server of this test process, with a migrated database to copy; started by the first test that needs one.</summary>
internal sealed class TestServer
{
    private const string Template = "unitvent_template";

    private static readonly Lazy<Task<TestServer>> Started = new(StartAsync);

    private TestServer(ServerAccess access) => Access = access;

    public static Task<TestServer> Shared => Started.Value;

    public ServerAccess Access { get; }

    public async Task CopyTemplateAsync(string database)
    {
        await using var superuser = await OpenAsync();
        await DatabaseRoles.EnsureDatabaseAsync(superuser, database, CancellationToken.None, Template);
    }

    public async Task DropAsync(string database)
    {
        await using var superuser = await OpenAsync();
        await ExecuteAsync(superuser, $"drop database {database} with (force)");
    }

    private static async Task<TestServer> StartAsync()
    {
        var server = new TestServer(await ContainerServer.TryStartAsync() ?? await PrivateServer.StartAsync());
        await server.MakeTemplateAsync();
        return server;
    }

    private async Task MakeTemplateAsync()
    {
        await using var superuser = await OpenAsync();
        await DatabaseRoles.EnsureDatabaseAsync(superuser, Template, CancellationToken.None);
        await StoreMigrations.MigrateAsync(Access.OwnerOf(Template), DatabaseRoles.Runtime, CancellationToken.None);
        await ExecuteAsync(superuser, $"alter database {Template} allow_connections false");
    }

    private async Task<NpgsqlConnection> OpenAsync()
    {
        var connection = new NpgsqlConnection(Access.Superuser);
        await connection.OpenAsync();
        return connection;
    }

    private static async Task ExecuteAsync(NpgsqlConnection connection, string statement)
    {
        await using var command = new NpgsqlCommand(statement, connection);
        await command.ExecuteNonQueryAsync();
    }
}
