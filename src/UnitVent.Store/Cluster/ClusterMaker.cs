namespace UnitVent.Store.Cluster;

/// <summary>Makes the cluster of a data folder where there is none yet.</summary>
internal static class ClusterMaker
{
    /// <summary>Makes the cluster beside its place and moves it there when it is whole, so that a broken attempt leaves no half of one.</summary>
    public static async Task EnsureMadeAsync(
        ClusterFolder folder, ServerAccount account, PostgresBinaries binaries, ClusterSecrets secrets, bool durable, CancellationToken cancellationToken)
    {
        folder.DeleteUnfinished();
        if (folder.DataMajor is not null)
        {
            return;
        }

        var unfinished = folder.NameUnfinished();
        await account.MakeFolderAsync(unfinished, cancellationToken);
        var data = Path.Combine(unfinished, "data");
        var passwordFile = Path.Combine(unfinished, "password");
        await account.WriteFileAsync(passwordFile, secrets.Superuser, cancellationToken);
        await ServerProgram.RunAsync(
            account.Command(binaries.InitDb, ServerSettings.ForInitDb(durable, data, passwordFile)), cancellationToken);
        Directory.Move(data, folder.Data);
        folder.DeleteUnfinished();
    }
}
