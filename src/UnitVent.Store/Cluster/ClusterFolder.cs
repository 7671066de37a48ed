using System.Globalization;

namespace UnitVent.Store.Cluster;

/// <summary>The data folder: where the server's files, the passwords and the lock lie in it.</summary>
internal sealed class ClusterFolder
{
    private const UnixFileMode Private = UnixFileMode.UserRead | UnixFileMode.UserWrite | UnixFileMode.UserExecute;
    private const UnixFileMode PassThrough = UnixFileMode.GroupExecute | UnixFileMode.OtherExecute;

    private const string UnfinishedPrefix = "postgres.unfinished";

    private readonly string path;

    private ClusterFolder(string path) => this.path = path;

    /// <summary>Gets the server's own folder.</summary>
    public string Data => Path.Combine(path, "postgres");

    public string Secrets => Path.Combine(path, "cluster-passwords.json");

    public string Lock => Path.Combine(path, "cluster.lock");

    /// <summary>Gets the major version of PostgreSQL that made the data; absent before the first start.</summary>
    public int? DataMajor => File.Exists(Path.Combine(Data, "PG_VERSION"))
        ? int.Parse(File.ReadAllText(Path.Combine(Data, "PG_VERSION")), CultureInfo.InvariantCulture)
        : null;

    /// <summary>Makes the folder where it is absent, and sees to it that the server's account can reach it.</summary>
    public static async Task<ClusterFolder> PrepareAsync(string path, ServerAccount account, CancellationToken cancellationToken)
    {
        var folder = new ClusterFolder(Path.GetFullPath(path));
        MakeMissing(folder.path, account.IsOther ? Private | PassThrough : Private);
        if (account.IsOther && !await account.CanEnterAsync(folder.path, cancellationToken))
        {
            await folder.OpenAsync(account, cancellationToken);
        }

        return folder;
    }

    /// <summary>Names a folder in which a cluster is made before it takes its place; another one each time.</summary>
    public string NameUnfinished() => Path.Combine(path, UnfinishedPrefix + Guid.NewGuid().ToString("N"));

    /// <summary>Deletes what broken attempts to make a cluster left. What one of them is still writing to is left to a later start.</summary>
    public void DeleteUnfinished()
    {
        foreach (var unfinished in Directory.GetDirectories(path, UnfinishedPrefix + "*"))
        {
            try
            {
                Directory.Delete(unfinished, recursive: true);
            }
            catch (IOException)
            {
                continue;
            }
        }
    }

    private static void MakeMissing(string path, UnixFileMode mode)
    {
        if (Directory.Exists(path))
        {
            return;
        }

        if (Path.GetDirectoryName(path) is { } parent)
        {
            MakeMissing(parent, mode);
        }

        Directory.CreateDirectory(path);
        File.SetUnixFileMode(path, mode);
    }

    /// <summary>Lets the server's account pass through this folder and temporary ones above it; any other is not ours to open.</summary>
    private async Task OpenAsync(ServerAccount account, CancellationToken cancellationToken)
    {
        foreach (var step in FromRoot(path))
        {
            if (await account.CanEnterAsync(step, cancellationToken))
            {
                continue;
            }

            if (step != path && !step.StartsWith(Path.GetTempPath(), StringComparison.Ordinal))
            {
                throw new LocalClusterException(
                    $"The PostgreSQL account cannot reach {path}, because {step} is closed to it. "
                    + $"Choose another data folder (UNITVENT_DATA), or allow it with: chmod o+x {step}");
            }

            File.SetUnixFileMode(step, File.GetUnixFileMode(step) | PassThrough);
        }
    }

    private static IEnumerable<string> FromRoot(string path) =>
        Path.GetDirectoryName(path) is { } parent ? FromRoot(parent).Append(path) : [path];
}
