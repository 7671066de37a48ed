using System.Net;
using System.Net.Sockets;
using Npgsql;

namespace UnitVent.Store.Tests;

/// <summary>A line to the server that passes everything on, and loses the answer to one commit when it is told to.</summary>
internal sealed class LossyLine : IAsyncDisposable
{
    private readonly TcpListener listener = new(IPAddress.Loopback, 0);
    private readonly CancellationTokenSource stop = new();
    private readonly (string Host, int Port) server;
    private int armed;
    private bool goDown;

    public LossyLine(string connectionString)
    {
        var to = new NpgsqlConnectionStringBuilder(connectionString);
        server = (to.Host!, to.Port);
        listener.Start();
        to.Port = ((IPEndPoint)listener.LocalEndpoint).Port;
        (to.Host, to.SslMode, to.GssEncryptionMode) = ("127.0.0.1", SslMode.Disable, GssEncryptionMode.Disable);
        ConnectionString = to.ConnectionString;
        _ = AcceptAsync();
    }

    public string ConnectionString { get; }

    public int Lost { get; private set; }

    public void LoseNextCommitAnswer(bool andGoDown = false) => (armed, goDown) = (1, andGoDown);

    public async ValueTask DisposeAsync()
    {
        listener.Stop();
        await stop.CancelAsync();
        stop.Dispose();
    }

    private async Task AcceptAsync()
    {
        try
        {
            while (true)
            {
                _ = CarryAsync(await listener.AcceptTcpClientAsync(stop.Token));
            }
        }
        catch (Exception e) when (e is OperationCanceledException or SocketException or ObjectDisposedException)
        {
            // The line is down.
        }
    }

    private async Task CarryAsync(TcpClient client)
    {
        using var near = client;
        using var far = new TcpClient();
        await far.ConnectAsync(server.Host, server.Port);
        var losing = new StrongBox();
        await Task.WhenAny(
            PassAsync(near.GetStream(), far.GetStream(), sent => losing.Value |= IsCommit(sent) && Interlocked.Exchange(ref armed, 0) == 1, _ => true),
            PassAsync(far.GetStream(), near.GetStream(), _ => { }, _ => !losing.Value || Lose()));
    }

    private bool Lose()
    {
        Lost++;
        if (goDown)
        {
            listener.Stop();
        }

        return false;
    }

    // A simple query of eleven bytes (PostgreSQL, message formats).
    private static bool IsCommit(ReadOnlyMemory<byte> sent) => sent.Span.IndexOf("Q\0\0\0\u000BCOMMIT\0"u8) >= 0;

    private static async Task PassAsync(NetworkStream from, NetworkStream to, Action<ReadOnlyMemory<byte>> look, Func<int, bool> goesOn)
    {
        var buffer = new byte[65536];
        try
        {
            while (await from.ReadAsync(buffer) is var read and > 0)
            {
                look(buffer.AsMemory(0, read));
                if (!goesOn(read))
                {
                    return;
                }

                await to.WriteAsync(buffer.AsMemory(0, read));
            }
        }
        catch (Exception e) when (e is IOException or ObjectDisposedException)
        {
            // One end hung up.
        }
    }

    private sealed class StrongBox
    {
        public bool Value { get; set; }
    }
}
