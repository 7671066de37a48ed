using System.Data.Common;
using UnitVent.Store;
using UnitVent.Store.Cluster;

namespace UnitVent.Web.Hosting;

/// <summary>The database to work with: a server that was given, or a private cluster that runs as long as this program.</summary>
public sealed class Database : IAsyncDisposable
{
    private readonly LocalCluster? cluster;

    private Database(string owner, string runtime, LocalCluster? cluster) =>
        (OwnerConnection, RuntimeConnection, this.cluster) = (owner, runtime, cluster);

    public string OwnerConnection { get; }

    public string RuntimeConnection { get; }

    /// <summary>As the run-time role, without waiting for the disk: for what can be told again, such as the demo unit.</summary>
    public string HastyConnection => new DbConnectionStringBuilder { ConnectionString = RuntimeConnection, ["Options"] = "-c synchronous_commit=off" }.ConnectionString;

    /// <summary>Ends when the private cluster does; never for a given server.</summary>
    public Task Ended => cluster?.Ended ?? Task.Delay(Timeout.Infinite);

    /// <summary>Opens the given server, or starts the private cluster, or joins it when another process runs it.</summary>
    /// <exception cref="LocalClusterException">The cluster cannot be run here.</exception>
    /// <exception cref="InvalidOperationException">Only one of the two connection strings was given.</exception>
    public static async Task<Database> OpenAsync(HostSettings settings, CancellationToken cancel)
    {
        switch (settings)
        {
            case { OwnerConnection: { } owner, RuntimeConnection: { } runtime }:
                return new Database(owner, runtime, null);
            case { OwnerConnection: null, RuntimeConnection: null }:
                var cluster = await LocalCluster.StartAsync(new LocalClusterOptions(settings.DataFolder, Durable: true), cancel);
                return new Database(cluster.OwnerConnectionString, cluster.RuntimeConnectionString, cluster);
            default:
                throw new InvalidOperationException("Give both ConnectionStrings__Owner and ConnectionStrings__Runtime, or neither.");
        }
    }

    /// <summary>Brings the tables to the shape that this program needs.</summary>
    public Task MigrateAsync(CancellationToken cancel) => StoreMigrations.MigrateAsync(OwnerConnection, Part("Username", "User ID", "User Name", "User"), cancel);

    /// <summary>A secret that stays the same from start to start and that only this installation knows.</summary>
    internal string InstallationSecret => Part("Password", "PWD");

    public ValueTask DisposeAsync() => cluster?.DisposeAsync() ?? ValueTask.CompletedTask;

    private string Part(params string[] names)
    {
        var parts = new DbConnectionStringBuilder { ConnectionString = RuntimeConnection };
        return names.Where(parts.ContainsKey).Select(n => (string)parts[n]).FirstOrDefault()
            ?? throw new InvalidOperationException($"The run-time connection string says nothing of {names[0]}.");
    }
}
