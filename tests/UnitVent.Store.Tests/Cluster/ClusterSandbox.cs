using Npgsql;
using UnitVent.Store.Cluster;

namespace UnitVent.Store.Tests.Cluster;

/// <summary>A data folder of its own for a test, with the few questions that the tests ask of a cluster in it.</summary>
public sealed class ClusterSandbox : IDisposable
{
    private static CancellationToken Cancellation => TestContext.Current.CancellationToken;

    public string Folder { get; } = Path.Combine(
        Directory.Exists("/dev/shm") ? "/dev/shm" : Path.GetTempPath(), "unitvent-cluster-" + Guid.NewGuid().ToString("N"));

    public string Data => Path.Combine(Folder, "postgres");

    public string PidFile => Path.Combine(Data, "postmaster.pid");

    public Task<LocalCluster> StartAsync() => LocalCluster.StartAsync(new(Folder, Durable: true), Cancellation);

    public static async Task<T> AskAsync<T>(string connectionString, string question)
    {
        await using var connection = new NpgsqlConnection(connectionString);
        await connection.OpenAsync(Cancellation);
        await using var command = new NpgsqlCommand(question, connection);
        return (T)(await command.ExecuteScalarAsync(Cancellation))!;
    }

    public static async Task TellAsync(string connectionString, string statement)
    {
        await using var connection = new NpgsqlConnection(connectionString);
        await connection.OpenAsync(Cancellation);
        await using var command = new NpgsqlCommand(statement, connection);
        await command.ExecuteNonQueryAsync(Cancellation);
    }

    /// <summary>Leaves one committed row, which every later start must find.</summary>
    public static Task LeaveRowAsync(LocalCluster cluster) =>
        TellAsync(cluster.OwnerConnectionString, "create table kept (word text); insert into kept values ('kept')");

    public static Task<string> ReadRowAsync(LocalCluster cluster) => AskAsync<string>(cluster.OwnerConnectionString, "select word from kept");

    public void Dispose()
    {
        if (Directory.Exists(Folder))
        {
            Directory.Delete(Folder, recursive: true);
        }
    }
}
