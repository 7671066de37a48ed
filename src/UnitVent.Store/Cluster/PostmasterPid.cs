using System.Globalization;

namespace UnitVent.Store.Cluster;

/// <summary>What the server says of itself in <c>postmaster.pid</c>.</summary>
/// <remarks>The lines of the file are those of PostgreSQL's <c>src/include/utils/pidfile.h</c>.</remarks>
internal sealed record PostmasterPid(int ProcessId, int Port, bool IsReady)
{
    private const int PortLine = 3;
    private const int StatusLine = 7;

    public static string PathIn(string data) => Path.Combine(data, "postmaster.pid");

    /// <summary>Reads the file; null when it is absent or only partly written.</summary>
    public static PostmasterPid? Read(string data) => ReadText(PathIn(data)) is { } text ? Parse(text) : null;

    /// <summary>Tells whether the process it names is alive and is the server of this very folder, not one that got the number later.</summary>
    public bool IsAliveIn(string data)
    {
        try
        {
            var program = Path.GetFileName(new FileInfo($"/proc/{ProcessId}/exe").LinkTarget);
            // "postgres (deleted)" after an upgrade of the package; a server's current folder is its data folder.
            return program?.Split(' ')[0] == "postgres"
                && ReadText(PathIn($"/proc/{ProcessId}/cwd")) is { } text
                && text == ReadText(PathIn(data));
        }
        catch (UnauthorizedAccessException)
        {
            return false;
        }
    }

    private static PostmasterPid? Parse(string text)
    {
        var lines = text.Split('\n');
        return int.TryParse(lines[0], CultureInfo.InvariantCulture, out var process)
            ? new(process, PortOf(lines), lines.Length > StatusLine && lines[StatusLine].Trim() == "ready")
            : null;
    }

    private static int PortOf(string[] lines) =>
        lines.Length > PortLine && int.TryParse(lines[PortLine], CultureInfo.InvariantCulture, out var port) ? port : 0;

    private static string? ReadText(string path)
    {
        try
        {
            return File.ReadAllText(path);
        }
        catch (IOException)
        {
            return null;
        }
    }
}
