using System.Globalization;

namespace UnitVent.Store.Cluster;

/// <summary>How the cluster is made and with which settings its server runs. What stands on its command line wins over its files.</summary>
internal static class ServerSettings
{
    private static readonly string[] Common =
    [
        "listen_addresses=127.0.0.1",
        "unix_socket_directories=",
        "timezone=UTC",
        "log_timezone=UTC",
        "jit=off",
        // Statements and details of errors can carry patient data: they stay out of the log.
        "log_min_error_statement=panic",
        "log_error_verbosity=terse",
    ];

    private static readonly string[] Durable =
    [
        "fsync=on",
        "synchronous_commit=on",
        "full_page_writes=on",
        "password_encryption=scram-sha-256",
        "logging_collector=on",
        "log_filename=postgresql-%a.log",
        "log_truncate_on_rotation=on",
        "log_rotation_age=1d",
        "log_rotation_size=0",
    ];

    private static readonly string[] ThrowAway =
    [
        "fsync=off",
        "synchronous_commit=off",
        "full_page_writes=off",
        "wal_level=minimal",
        "max_wal_senders=0",
        "max_wal_size=2GB",
        "autovacuum=off",
        "max_connections=200",
        // In the data folder, so that nothing is left behind when the server is killed.
        "dynamic_shared_memory_type=mmap",
    ];

    /// <summary>The arguments that make a cluster, its superuser's password being in a file.</summary>
    public static IEnumerable<string> ForInitDb(bool durable, string data, string passwordFile) =>
    [
        "--pgdata", data, "--username", DatabaseRoles.Superuser, "--pwfile", passwordFile,
        "--encoding", "UTF8", "--locale", "C.UTF-8", "--no-instructions",
        .. durable ? (string[])["--auth=scram-sha-256", "--data-checksums"] : ["--auth=trust", "--no-sync", "--wal-segsize=1"],
    ];

    /// <summary>The arguments that run its server.</summary>
    public static IEnumerable<string> ForServer(bool durable, string data, int port) =>
    [
        "-D", data, "-p", port.ToString(CultureInfo.InvariantCulture),
        .. Common.Concat(durable ? Durable : ThrowAway).SelectMany(setting => (string[])["-c", setting]),
    ];
}
