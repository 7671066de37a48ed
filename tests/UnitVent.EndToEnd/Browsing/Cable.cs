using System.Collections.Concurrent;
using System.Net;
using System.Net.Sockets;

namespace UnitVent.EndToEnd.Browsing;

/// <summary>The cable between the program and its database, which a test can pull and plug in again.</summary>
internal sealed class Cable : IDisposable
{
    private readonly TcpListener listener = new(IPAddress.Loopback, 0);
    private readonly ConcurrentDictionary<TcpClient, bool> ends = new();
    private readonly string host;
    private readonly int port;
    private volatile bool pulled;

    public Cable(string host, int port)
    {
        (this.host, this.port) = (host, port);
        listener.Start();
        _ = AcceptAsync();
    }

    public int Port => ((IPEndPoint)listener.LocalEndpoint).Port;

    public void Pull()
    {
        pulled = true;
        foreach (var end in ends.Keys)
        {
            end.Dispose();
        }
    }

    public void Plug() => pulled = false;

    public void Dispose()
    {
        listener.Dispose();
        Pull();
    }

    private async Task AcceptAsync()
    {
        try
        {
            while (true)
            {
                _ = CarryAsync(await listener.AcceptTcpClientAsync());
            }
        }
        catch (Exception e) when (e is SocketException or ObjectDisposedException)
        {
            // The listener was disposed.
        }
    }

    private async Task CarryAsync(TcpClient near)
    {
        using var far = new TcpClient();
        (ends[near], ends[far]) = (true, true);
        try
        {
            if (!pulled)
            {
                await far.ConnectAsync(host, port);
                await Task.WhenAny(near.GetStream().CopyToAsync(far.GetStream()), far.GetStream().CopyToAsync(near.GetStream()));
            }
        }
        catch (Exception e) when (e is IOException or SocketException or ObjectDisposedException or InvalidOperationException)
        {
            // Pulled, or one side hung up.
        }
        finally
        {
            near.Dispose();
            ends.TryRemove(near, out _);
            ends.TryRemove(far, out _);
        }
    }
}
