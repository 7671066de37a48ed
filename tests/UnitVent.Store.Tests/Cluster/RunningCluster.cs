using UnitVent.Store.Cluster;

namespace UnitVent.Store.Tests.Cluster;

/// <summary>A durable cluster for the tests that only read.</summary>
public sealed class RunningCluster : IAsyncLifetime
{
    private readonly ClusterSandbox sandbox = new();

    public LocalCluster Cluster { get; private set; } = null!;

    public string Folder => sandbox.Folder;

    public async ValueTask InitializeAsync() => Cluster = await sandbox.StartAsync();

    public async ValueTask DisposeAsync()
    {
        await Cluster.DisposeAsync();
        sandbox.Dispose();
    }
}
