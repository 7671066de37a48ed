using System.Security.Cryptography;
using DotNet.Testcontainers.Builders;
using Npgsql;
using Testcontainers.PostgreSql;
using UnitVent.Store.Cluster;

namespace UnitVent.Testing;

/// <summary>A server in a container, for machines where a container engine answers.</summary>
internal static class ContainerServer
{
    /// <summary>Starts the container; null where no engine answers. Testcontainers removes it after this process.</summary>
    public static async Task<ServerAccess?> TryStartAsync()
    {
        try
        {
            var container = new PostgreSqlBuilder("postgres:17")
                .WithTmpfsMount("/var/lib/postgresql/data")
                .WithCommand("-c", "fsync=off", "-c", "synchronous_commit=off", "-c", "full_page_writes=off", "-c", "jit=off", "-c", "max_connections=200")
                .Build();
            await container.StartAsync();
            return await SetUpAsync(container.GetConnectionString());
        }
        catch (DockerUnavailableException)
        {
            return null;
        }
    }

    private static async Task<ServerAccess> SetUpAsync(string connectionString)
    {
        var superuser = new NpgsqlConnectionStringBuilder(connectionString) { Database = "postgres", Pooling = false };
        var password = RandomNumberGenerator.GetHexString(32);
        await using var connection = new NpgsqlConnection(superuser.ConnectionString);
        await connection.OpenAsync();
        await DatabaseRoles.EnsureRolesAsync(connection, password, password, CancellationToken.None);
        return new(superuser.ConnectionString, SignIn(DatabaseRoles.Owner, pooling: false), SignIn(DatabaseRoles.Runtime, pooling: true));

        string SignIn(string role, bool pooling) => new NpgsqlConnectionStringBuilder(superuser.ConnectionString)
        {
            Username = role,
            Password = password,
            Pooling = pooling,
        }.ConnectionString;
    }
}
