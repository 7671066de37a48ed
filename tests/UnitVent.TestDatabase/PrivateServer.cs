using System.Globalization;
using UnitVent.Store.Cluster;

namespace UnitVent.Testing;

/// <summary>A private cluster in memory, or in the temporary folder where memory is short; it goes with this process.</summary>
internal static class PrivateServer
{
    private const string FolderPrefix = "unitvent-test-";
    private const string Memory = "/dev/shm";
    private const long BytesNeeded = 2L << 30;

    public static async Task<ServerAccess> StartAsync()
    {
        var place = Directory.Exists(Memory) && new DriveInfo(Memory).AvailableFreeSpace > BytesNeeded ? Memory : Path.GetTempPath();
        DeleteRemains(place);
        var folder = Path.Combine(place, FolderPrefix + Environment.ProcessId.ToString(CultureInfo.InvariantCulture));
        var cluster = await LocalCluster.StartAsync(new(folder, Durable: false), CancellationToken.None);
        AppDomain.CurrentDomain.ProcessExit += (_, _) =>
        {
            cluster.DisposeAsync().AsTask().GetAwaiter().GetResult();
            Delete(folder);
        };
        return new(cluster.SuperuserConnectionString, cluster.OwnerConnectionString, cluster.RuntimeConnectionString);
    }

    /// <summary>Deletes what killed test processes left; their folders carry their numbers.</summary>
    private static void DeleteRemains(string place)
    {
        foreach (var folder in Directory.GetDirectories(place, FolderPrefix + "*"))
        {
            if (!Directory.Exists("/proc/" + Path.GetFileName(folder)[FolderPrefix.Length..]))
            {
                Delete(folder);
            }
        }
    }

    private static void Delete(string folder)
    {
        try
        {
            Directory.Delete(folder, recursive: true);
        }
        catch (Exception e) when (e is IOException or UnauthorizedAccessException)
        {
            // Another run deletes it too, its server is still on the way out, or it is another user's: the next run tries again.
        }
    }
}
