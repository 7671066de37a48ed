using Npgsql;

namespace UnitVent.Store.Cluster;

/// <summary>
/// A private PostgreSQL server on a port of 127.0.0.1 that runs as long as this program does. The first program to start
/// one on a data folder owns the server; another that comes while the owner lives joins it.
/// </summary>
public sealed class LocalCluster : IAsyncDisposable
{
    /// <summary>The database of the charts.</summary>
    public const string Database = "unitvent";

    private const int JoinAttempts = 1200;
    private static readonly TimeSpan JoinPause = TimeSpan.FromMilliseconds(50);

    private readonly ClusterSecrets secrets;
    private readonly ClusterServer? owned;

    private LocalCluster(ClusterSecrets secrets, int port, ClusterServer? owned)
    {
        this.secrets = secrets;
        this.owned = owned;
        Port = port;
        Ended = owned?.Ended ?? new TaskCompletionSource().Task;
    }

    /// <summary>Gets the port on 127.0.0.1; another one after each start.</summary>
    public int Port { get; }

    /// <summary>Gets a value indicating whether this program started the server, and stops it on disposal.</summary>
    public bool IsOwner => owned is not null;

    /// <summary>Gets the way in for migrations: the role that owns <see cref="Database"/>. Its connections are not pooled.</summary>
    public string OwnerConnectionString => ConnectionString(DatabaseRoles.Owner, secrets.Owner, Database, pooling: false);

    /// <summary>Gets the way in for the program at work: a role that defines nothing in <see cref="Database"/>.</summary>
    public string RuntimeConnectionString => ConnectionString(DatabaseRoles.Runtime, secrets.Runtime, Database, pooling: true);

    /// <summary>Gets the way in for setting up roles and databases, and for nothing else. Its connections are not pooled.</summary>
    public string SuperuserConnectionString =>
        ConnectionString(DatabaseRoles.Superuser, secrets.Superuser, DatabaseRoles.Superuser, pooling: false);

    /// <summary>Gets a task that ends when an owned server does, asked or not; a joined server is its owner's to watch.</summary>
    public Task Ended { get; }

    /// <summary>Gets the process of an owned server; absent for a joined one.</summary>
    internal int? ProcessId => owned?.ProcessId;

    /// <summary>Starts the server of a data folder, made on first use, or joins the one that another program runs on it.</summary>
    /// <param name="options">The folder, and how careful the server is.</param>
    /// <param name="cancellationToken">Gives up the start, and stops a server that was already on its way.</param>
    /// <returns>A cluster that takes connections and has both roles and <see cref="Database"/>.</returns>
    /// <exception cref="LocalClusterException">It cannot be run here; the message says what to do.</exception>
    public static async Task<LocalCluster> StartAsync(LocalClusterOptions options, CancellationToken cancellationToken)
    {
        var account = await ServerAccount.ChooseAsync(cancellationToken);
        var folder = await ClusterFolder.PrepareAsync(options.DataFolder, account, cancellationToken);
        for (var attempt = 0; attempt < JoinAttempts; attempt++)
        {
            if (ClusterLease.TryTake(folder) is { } lease)
            {
                return await StartOwnedAsync(options, folder, account, lease, cancellationToken);
            }

            if (await TryJoinAsync(folder, cancellationToken) is { } joined)
            {
                return joined;
            }

            await Task.Delay(JoinPause, cancellationToken);
        }

        throw new LocalClusterException($"Another program holds {folder.Lock}, but its PostgreSQL server does not answer. Stop that program first.");
    }

    /// <summary>Stops an owned server: open transactions are rolled back, everything committed is on disk.</summary>
    /// <returns>A task that ends when the server is gone.</returns>
    public async ValueTask DisposeAsync()
    {
        if (owned is not null)
        {
            await owned.DisposeAsync();
        }
    }

    private static async Task<LocalCluster> StartOwnedAsync(
        LocalClusterOptions options, ClusterFolder folder, ServerAccount account, ClusterLease lease, CancellationToken cancellationToken)
    {
        ClusterServer? server = null;
        try
        {
            var binaries = await PostgresBinaries.FindAsync(options.BinFolder, folder.DataMajor, cancellationToken);
            var secrets = ClusterSecrets.LoadOrCreate(folder);
            await ClusterMaker.EnsureMadeAsync(folder, account, binaries, secrets, options.Durable, cancellationToken);
            server = new(folder, account, binaries, lease, options.Durable);
            await server.StartAsync(cancellationToken);
            var cluster = new LocalCluster(secrets, server.Port, server);
            await cluster.SetUpDatabaseAsync(cancellationToken);
            return cluster;
        }
        catch
        {
            lease.Dispose();
            await (server?.DisposeAsync() ?? ValueTask.CompletedTask);
            throw;
        }
    }

    /// <summary>Joins a server that is up and set up; null while its owner is not that far, or is stopping it.</summary>
    private static async Task<LocalCluster?> TryJoinAsync(ClusterFolder folder, CancellationToken cancellationToken)
    {
        if (PostmasterPid.Read(folder.Data) is not { IsReady: true } server || !server.IsAliveIn(folder.Data))
        {
            return null;
        }

        try
        {
            var cluster = new LocalCluster(ClusterSecrets.LoadOrCreate(folder), server.Port, owned: null);
            await using var connection = new NpgsqlConnection(cluster.OwnerConnectionString);
            await connection.OpenAsync(cancellationToken);
            return cluster;
        }
        catch (NpgsqlException)
        {
            return null;
        }
    }

    private async Task SetUpDatabaseAsync(CancellationToken cancellationToken)
    {
        await using var superuser = new NpgsqlConnection(SuperuserConnectionString);
        await superuser.OpenAsync(cancellationToken);
        await DatabaseRoles.EnsureRolesAsync(superuser, secrets.Owner, secrets.Runtime, cancellationToken);
        await DatabaseRoles.EnsureDatabaseAsync(superuser, Database, cancellationToken);
    }

    private string ConnectionString(string role, string password, string database, bool pooling) => new NpgsqlConnectionStringBuilder
    {
        Host = "127.0.0.1",
        Port = Port,
        Database = database,
        Username = role,
        Password = password,
        Pooling = pooling,
        SslMode = SslMode.Disable,
        GssEncryptionMode = GssEncryptionMode.Disable,
        ApplicationName = Database,
    }.ConnectionString;
}
