using System.Security.Cryptography;
using System.Text.Json;

namespace UnitVent.Store.Cluster;

/// <summary>The passwords of the three roles, made once, 256 random bits each, in a file that only its owner can read.</summary>
internal sealed record ClusterSecrets(string Superuser, string Owner, string Runtime)
{
    public static ClusterSecrets LoadOrCreate(ClusterFolder folder)
    {
        if (!File.Exists(folder.Secrets))
        {
            if (folder.DataMajor is not null)
            {
                throw new LocalClusterException(
                    $"{folder.Data} holds a cluster, but its passwords, {folder.Secrets}, are gone. Put that file back from the backup.");
            }

            Save(new(NewPassword(), NewPassword(), NewPassword()), folder.Secrets);
        }

        return JsonSerializer.Deserialize<ClusterSecrets>(File.ReadAllText(folder.Secrets))!;
    }

    private static string NewPassword() => RandomNumberGenerator.GetHexString(64, lowercase: true);

    private static void Save(ClusterSecrets secrets, string path)
    {
        var unfinished = path + ".unfinished";
        File.Delete(unfinished);
        using (var file = new FileStream(unfinished, new FileStreamOptions
        {
            Mode = FileMode.CreateNew,
            Access = FileAccess.Write,
            UnixCreateMode = UnixFileMode.UserRead | UnixFileMode.UserWrite,
        }))
        {
            JsonSerializer.Serialize(file, secrets);
            file.Flush(flushToDisk: true);
        }

        File.Move(unfinished, path);
    }
}
