namespace UnitVent.Web.Hosting;

/// <summary>What the environment says about where data live and where the program listens.</summary>
/// <param name="DataFolder">The folder of the private database cluster.</param>
/// <param name="Url">The address to listen on.</param>
/// <param name="OwnerConnection">The role that owns the tables on a given server; null for the private cluster.</param>
/// <param name="RuntimeConnection">The role that the program works as on a given server.</param>
public sealed record HostSettings(string DataFolder, string Url, string? OwnerConnection, string? RuntimeConnection)
{
    public static HostSettings From(IConfiguration configuration) => new(
        configuration["UNITVENT_DATA"] is { Length: > 0 } folder ? Path.GetFullPath(folder) : DefaultDataFolder(),
        configuration["UNITVENT_URL"] is { Length: > 0 } url ? url : "http://127.0.0.1:5080",
        configuration.GetConnectionString("Owner"),
        configuration.GetConnectionString("Runtime"));

    private static string DefaultDataFolder() => Environment.IsPrivilegedProcess
        ? "/var/lib/unitvent"
        : Path.Combine(Environment.GetFolderPath(Environment.SpecialFolder.LocalApplicationData), "unitvent");
}
