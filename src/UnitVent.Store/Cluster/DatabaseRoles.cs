using Npgsql;

namespace UnitVent.Store.Cluster;

/// <summary>The two roles that the program signs in as, and a database as they need it.</summary>
/// <remarks>Names and passwords are put into the statements as text: they must come from the program, never from a user.</remarks>
public static class DatabaseRoles
{
    /// <summary>The role that owns the database and migrates it.</summary>
    public const string Owner = "unitvent_owner";

    /// <summary>The role that the program works as; it defines nothing, and may do what the migrations grant it.</summary>
    public const string Runtime = "unitvent_runtime";

    internal const string Superuser = "postgres";

    /// <summary>Makes both roles where they are absent, and gives them these passwords.</summary>
    /// <param name="superuser">An open connection of a superuser.</param>
    /// <param name="ownerPassword">The password of <see cref="Owner"/>, letters and digits only.</param>
    /// <param name="runtimePassword">The password of <see cref="Runtime"/>, letters and digits only.</param>
    /// <param name="cancellationToken">Stops the wait for the server.</param>
    /// <exception cref="NpgsqlException">The server refused or is gone.</exception>
    public static async Task EnsureRolesAsync(
        NpgsqlConnection superuser, string ownerPassword, string runtimePassword, CancellationToken cancellationToken)
    {
        foreach (var (role, password) in new[] { (Owner, ownerPassword), (Runtime, runtimePassword) })
        {
            if (!await ExistsAsync(superuser, "select 1 from pg_roles where rolname = $1", role, cancellationToken))
            {
                await ExecuteAsync(superuser, $"create role {role}", cancellationToken);
            }

            await ExecuteAsync(superuser, $"alter role {role} login password '{password}'", cancellationToken);
        }
    }

    /// <summary>Makes a database where it is absent, owned by <see cref="Owner"/>, open to both roles and to nobody else.</summary>
    /// <param name="superuser">An open connection of a superuser.</param>
    /// <param name="database">The name, in small letters, digits and underscores.</param>
    /// <param name="cancellationToken">Stops the wait for the server.</param>
    /// <param name="template">The database to copy, which nobody may be using; absent for an empty one.</param>
    /// <exception cref="NpgsqlException">The server refused or is gone.</exception>
    public static async Task EnsureDatabaseAsync(
        NpgsqlConnection superuser, string database, CancellationToken cancellationToken, string? template = null)
    {
        if (!await ExistsAsync(superuser, "select 1 from pg_database where datname = $1", database, cancellationToken))
        {
            var copy = template is null ? "" : $"template {template} strategy file_copy";
            await ExecuteAsync(superuser, $"create database {database} owner {Owner} {copy}", cancellationToken);
        }

        await ExecuteAsync(superuser, $"revoke all on database {database} from public", cancellationToken);
        await ExecuteAsync(superuser, $"grant connect on database {database} to {Runtime}", cancellationToken);
    }

    private static async Task<bool> ExistsAsync(NpgsqlConnection connection, string query, string name, CancellationToken cancellationToken)
    {
        await using var command = new NpgsqlCommand(query, connection) { Parameters = { new() { Value = name } } };
        return await command.ExecuteScalarAsync(cancellationToken) is not null;
    }

    private static async Task ExecuteAsync(NpgsqlConnection connection, string statement, CancellationToken cancellationToken)
    {
        await using var command = new NpgsqlCommand(statement, connection);
        await command.ExecuteNonQueryAsync(cancellationToken);
    }
}
