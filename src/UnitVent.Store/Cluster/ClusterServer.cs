using System.Net;
using System.Net.Sockets;

namespace UnitVent.Store.Cluster;

/// <summary>The server of one data folder, in the hands of the holder of its lease.</summary>
internal sealed class ClusterServer(
    ClusterFolder folder, ServerAccount account, PostgresBinaries binaries, ClusterLease lease, bool durable) : IAsyncDisposable
{
    private const int Attempts = 5;
    private static readonly TimeSpan FirstPause = TimeSpan.FromMilliseconds(100);

    private PostgresProcess? process;

    public int Port { get; private set; }

    public int ProcessId => Process.Id;

    public Task Ended => Process.WaitForEndAsync(CancellationToken.None);

    private PostgresProcess Process => process ?? throw new InvalidOperationException("The server was not started.");

    /// <summary>
    /// Starts the server on a free port. Another program may take the port first, and the last processes of a killed
    /// server may need a moment to go, so a failed start is tried again.
    /// </summary>
    public async Task StartAsync(CancellationToken cancellationToken)
    {
        await ClearRemainsAsync(cancellationToken);
        for (var attempt = 1; !await TryStartAsync(cancellationToken); attempt++)
        {
            if (attempt == Attempts)
            {
                throw new LocalClusterException(
                    $"The PostgreSQL server on {folder.Data} does not start (see also the folder log in it): {Process.LastWords}");
            }

            await Task.Delay(FirstPause * (1 << attempt), cancellationToken);
        }
    }

    /// <summary>Stops the server and gives the lease back. One that cannot be asked to stop is killed, which loses nothing committed.</summary>
    public async ValueTask DisposeAsync()
    {
        try
        {
            if (process is { HasExited: false })
            {
                await StopAsync(CancellationToken.None);
            }
        }
        catch (LocalClusterException)
        {
            Process.Kill();
        }
        finally
        {
            lease.Dispose();
        }
    }

    internal static int FreePort()
    {
        using var listener = new TcpListener(IPAddress.Loopback, port: 0);
        listener.Start();
        return ((IPEndPoint)listener.LocalEndpoint).Port;
    }

    /// <summary>Clears away what a killed predecessor left: a server without an owner, or a process file that names a stranger.</summary>
    private async Task ClearRemainsAsync(CancellationToken cancellationToken)
    {
        if (PostmasterPid.Read(folder.Data) is not { } remains)
        {
            return;
        }

        if (remains.IsAliveIn(folder.Data))
        {
            await StopAsync(cancellationToken);
        }
        else if (Directory.Exists($"/proc/{remains.ProcessId}"))
        {
            File.Delete(PostmasterPid.PathIn(folder.Data));
        }
    }

    private async Task<bool> TryStartAsync(CancellationToken cancellationToken)
    {
        Port = FreePort();
        process = await PostgresProcess.StartAsync(
            account.LastingCommand(binaries.Postgres, ServerSettings.ForServer(durable, folder.Data, Port)));
        return await process.IsReadyAsync(folder.Data, cancellationToken);
    }

    private Task<string> StopAsync(CancellationToken cancellationToken) => ServerProgram.RunAsync(
        account.Command(binaries.PgCtl, "stop", "-D", folder.Data, "-m", "fast", "-w", "-t", "60"), cancellationToken);
}
