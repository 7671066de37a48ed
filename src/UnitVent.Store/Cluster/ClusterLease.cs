namespace UnitVent.Store.Cluster;

/// <summary>The right to run the server of one data folder. The system takes it back when the holder ends, however it ends.</summary>
internal sealed class ClusterLease : IDisposable
{
    private readonly FileStream held;

    private ClusterLease(FileStream held) => this.held = held;

    /// <summary>Takes the lease, or returns null when somebody alive holds it.</summary>
    public static ClusterLease? TryTake(ClusterFolder folder)
    {
        try
        {
            return new(new FileStream(folder.Lock, new FileStreamOptions
            {
                Mode = FileMode.OpenOrCreate,
                Access = FileAccess.ReadWrite,
                Share = FileShare.None,
                UnixCreateMode = UnixFileMode.UserRead | UnixFileMode.UserWrite,
            }));
        }
        catch (IOException) when (File.Exists(folder.Lock))
        {
            return null;
        }
    }

    public void Dispose() => held.Dispose();
}
