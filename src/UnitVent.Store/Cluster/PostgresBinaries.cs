using System.Globalization;
using System.Text.RegularExpressions;

namespace UnitVent.Store.Cluster;

/// <summary>The server programs of one PostgreSQL version.</summary>
internal sealed partial record PostgresBinaries(string Folder, int Major)
{
    private const int OldestMajor = 15;

    // Debian, Alpine, and the PostgreSQL project's own packages; Fedora and others put them on the path.
    private static readonly (string Parent, string Pattern, string Below)[] KnownPlaces =
    [
        ("/usr/lib/postgresql", "*", "bin"),
        ("/usr/libexec", "postgresql*", ""),
        ("/usr", "pgsql-*", "bin"),
    ];

    public string Postgres => Path.Combine(Folder, "postgres");

    public string InitDb => Path.Combine(Folder, "initdb");

    public string PgCtl => Path.Combine(Folder, "pg_ctl");

    /// <summary>Finds the newest installed version, or the one that made the data that is already there.</summary>
    public static async Task<PostgresBinaries> FindAsync(string? binFolder, int? dataMajor, CancellationToken cancellationToken)
    {
        var found = new List<PostgresBinaries>();
        foreach (var folder in binFolder is null ? InstalledFolders() : [binFolder])
        {
            if (File.Exists(Path.Combine(folder, "initdb")) && File.Exists(Path.Combine(folder, "postgres")))
            {
                found.Add(new(folder, await ReadMajorAsync(folder, cancellationToken)));
            }
        }

        return found.Where(b => dataMajor is null ? b.Major >= OldestMajor : b.Major == dataMajor).MaxBy(b => b.Major)
            ?? throw new LocalClusterException(Missing(binFolder, dataMajor));
    }

    private static IEnumerable<string> InstalledFolders() => KnownPlaces
        .Where(place => Directory.Exists(place.Parent))
        .SelectMany(place => Directory.GetDirectories(place.Parent, place.Pattern).Select(d => Path.Combine(d, place.Below)))
        .Concat((Environment.GetEnvironmentVariable("PATH") ?? "").Split(':', StringSplitOptions.RemoveEmptyEntries))
        .Distinct();

    private static async Task<int> ReadMajorAsync(string folder, CancellationToken cancellationToken)
    {
        var line = await ServerProgram.RunAsync(ServerProgram.Of(Path.Combine(folder, "postgres"), "--version"), cancellationToken);
        return int.Parse(LeadingVersion().Match(line).Value, CultureInfo.InvariantCulture);
    }

    private static string Missing(string? binFolder, int? dataMajor)
    {
        var version = dataMajor is null ? $"{OldestMajor} or newer" : $"{dataMajor} (which made the data in this folder)";
        var place = binFolder is null ? "on this machine" : $"in {binFolder} (UNITVENT_PG_BIN)";
        return $"No PostgreSQL server programs, version {version}, were found {place}. Install them "
            + "(Debian, Ubuntu: apt-get install postgresql; Fedora: dnf install postgresql-server postgresql-contrib; "
            + "Alpine: apk add postgresql postgresql-contrib setpriv setsid), or give connection strings of a server of your own.";
    }

    [GeneratedRegex(@"(?<=\) )\d+")]
    private static partial Regex LeadingVersion();
}
