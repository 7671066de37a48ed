using Npgsql;

namespace UnitVent.Testing;

/// <summary>A database of its own for a class of tests: migrated, empty, gone after disposal.</summary>
public sealed class TestDatabase : IAsyncDisposable
{
    private readonly TestServer server;
    private readonly string name;

    private TestDatabase(TestServer server, string name)
    {
        this.server = server;
        this.name = name;
        OwnerConnectionString = server.Access.OwnerOf(name);
        RuntimeConnectionString = server.Access.RuntimeOf(name);
    }

    /// <summary>Gets the way in for looking behind the program's back; it may do anything but is bound to this database.</summary>
    public string OwnerConnectionString { get; }

    /// <summary>Gets the way in that the program uses.</summary>
    public string RuntimeConnectionString { get; }

    /// <summary>Copies the migrated template of this process's server, which the first call starts.</summary>
    public static async Task<TestDatabase> CreateAsync()
    {
        var server = await TestServer.Shared;
        var name = "test_" + Guid.NewGuid().ToString("N");
        await server.CopyTemplateAsync(name);
        return new(server, name);
    }

    public async ValueTask DisposeAsync()
    {
        await using (var pooled = new NpgsqlConnection(RuntimeConnectionString))
        {
            NpgsqlConnection.ClearPool(pooled);
        }

        await server.DropAsync(name);
    }
}
