using System.Collections.Concurrent;
using Microsoft.Extensions.Hosting;
using Microsoft.Extensions.Logging;
using Npgsql;

namespace UnitVent.Store.Live;

/// <summary>Tells this node's screens that something of a unit changed. One listening connection; it comes back by itself.</summary>
public sealed class ChangeFeed : BackgroundService
{
    private static readonly TimeSpan Coalesce = TimeSpan.FromMilliseconds(100);
    private static readonly TimeSpan Retry = TimeSpan.FromMilliseconds(500);
    private static readonly TimeSpan StillThere = TimeSpan.FromSeconds(5);

    private readonly ConcurrentDictionary<Guid, Subscription> subscriptions = new();
    private readonly ConcurrentDictionary<Guid, bool> pending = new();
    private readonly string connectionString;
    private readonly ILogger<ChangeFeed> log;
    private volatile bool connected;

    internal ChangeFeed(string runtimeConnectionString, ILogger<ChangeFeed> log)
    {
        connectionString = new NpgsqlConnectionStringBuilder(runtimeConnectionString) { Pooling = false, KeepAlive = 15, ApplicationName = "unitvent change feed" }.ConnectionString;
        this.log = log;
    }

    /// <summary>Raised at once for a unit that changed; null when anything may have changed.</summary>
    internal event Action<Guid?>? Noticed;

    /// <summary>Gets whether changes are heard at this moment.</summary>
    public bool Connected => connected;

    /// <summary>Calls back, at most ten times a second, when a unit's charts changed or the feed was lost or came back.</summary>
    /// <param name="unitId">The unit.</param>
    /// <param name="changed">Called on a pool thread; what it throws stops nobody else.</param>
    /// <returns>Ends the subscription when disposed.</returns>
    public IDisposable Subscribe(Guid unitId, Func<Task> changed)
    {
        var subscription = new Subscription(this, Guid.NewGuid(), unitId, changed);
        subscriptions[subscription.Id] = subscription;
        return subscription;
    }

    /// <inheritdoc/>
    protected override async Task ExecuteAsync(CancellationToken stoppingToken)
    {
        while (!stoppingToken.IsCancellationRequested)
        {
            try
            {
                await ListenAsync(stoppingToken);
            }
            catch (OperationCanceledException) when (stoppingToken.IsCancellationRequested)
            {
                return;
            }
            catch (Exception e) when (e is NpgsqlException or IOException or TimeoutException or System.Net.Sockets.SocketException)
            {
                if (connected)
                {
                    log.LogWarning("The change feed was lost: {Error}", e.GetType().Name);
                    connected = false;
                    Everything();
                }

                await Task.Delay(Retry, stoppingToken).ConfigureAwait(ConfigureAwaitOptions.SuppressThrowing);
            }
        }
    }

    private async Task ListenAsync(CancellationToken stoppingToken)
    {
        await using var connection = new NpgsqlConnection(connectionString);
        connection.Notification += (_, notice) => Take(notice.Payload);
        await connection.OpenAsync(stoppingToken);
        await using (var listen = connection.CreateCommand())
        {
            listen.CommandText = "listen " + Notices.Channel;
            await listen.ExecuteNonQueryAsync(stoppingToken);
        }

        connected = true;
        Everything();
        while (true)
        {
            if (!await connection.WaitAsync(StillThere, stoppingToken))
            {
                await using var ask = connection.CreateCommand();
                ask.CommandText = "select 1";
                await ask.ExecuteNonQueryAsync(stoppingToken);
            }
        }
    }

    private void Take(string payload)
    {
        if (Guid.TryParse(payload, out var unitId))
        {
            Noticed?.Invoke(unitId);
            Call(unitId);
        }
    }

    // What was sent while nobody listened is lost: everybody looks again.
    private void Everything()
    {
        Noticed?.Invoke(null);
        foreach (var unitId in subscriptions.Values.Select(s => s.UnitId).Distinct())
        {
            Call(unitId);
        }
    }

    private void Call(Guid unitId)
    {
        if (pending.TryAdd(unitId, true))
        {
            _ = CallSoonAsync(unitId);
        }
    }

    private async Task CallSoonAsync(Guid unitId)
    {
        await Task.Delay(Coalesce);
        pending.TryRemove(unitId, out _);
        await Task.WhenAll(subscriptions.Values.Where(s => s.UnitId == unitId).Select(TellAsync));
    }

    private async Task TellAsync(Subscription subscription)
    {
        try
        {
            await subscription.Changed();
        }
#pragma warning disable CA1031 // One screen that fails must not keep the others from hearing.
        catch (Exception e)
#pragma warning restore CA1031
        {
            log.LogWarning("A subscriber of the change feed failed: {Error}", e.GetType().Name);
        }
    }

    private sealed record Subscription(ChangeFeed Feed, Guid Id, Guid UnitId, Func<Task> Changed) : IDisposable
    {
        public void Dispose() => Feed.subscriptions.TryRemove(Id, out _);
    }
}
