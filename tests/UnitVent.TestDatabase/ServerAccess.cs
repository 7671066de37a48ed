using Npgsql;

namespace UnitVent.Testing;

/// <summary>The ways into a running server, each for any of its databases.</summary>
internal sealed record ServerAccess(string Superuser, string Owner, string Runtime)
{
    public string OwnerOf(string database) => In(Owner, database);

    /// <summary>Few connections for each of many databases: one server serves all classes of a run.</summary>
    public string RuntimeOf(string database) =>
        new NpgsqlConnectionStringBuilder(In(Runtime, database)) { MaxPoolSize = 20 }.ConnectionString;

    private static string In(string connectionString, string database) =>
        new NpgsqlConnectionStringBuilder(connectionString) { Database = database }.ConnectionString;
}
