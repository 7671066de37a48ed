namespace UnitVent.Store.Cluster;

/// <summary>Says where a private PostgreSQL cluster lives and how careful it is with what it is given.</summary>
/// <param name="DataFolder">The folder for the cluster, its passwords and its lock; made when absent, and used for nothing else.</param>
/// <param name="Durable">
/// True for charts: every commit reaches the disk, pages carry checksums, and each role signs in with a password.
/// False for tests: fast, and lost with the machine.
/// </param>
public sealed record LocalClusterOptions(string DataFolder, bool Durable)
{
    /// <summary>Gets the folder of the server programs; when absent the newest installed ones are taken.</summary>
    /// <value>The default is the environment variable <c>UNITVENT_PG_BIN</c>, absent when it is not set.</value>
    public string? BinFolder { get; init; } = Environment.GetEnvironmentVariable("UNITVENT_PG_BIN");
}
