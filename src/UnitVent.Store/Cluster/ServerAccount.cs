using System.Diagnostics;

namespace UnitVent.Store.Cluster;

/// <summary>The account that the server runs as: <c>postgres</c> when this program runs as root, else this program's own.</summary>
internal sealed class ServerAccount
{
    private const string Name = "postgres";

    private ServerAccount(bool isOther) => IsOther = isOther;

    /// <summary>Gets a value indicating whether the server's account is not the one of this program.</summary>
    public bool IsOther { get; }

    public static async Task<ServerAccount> ChooseAsync(CancellationToken cancellationToken)
    {
        if (!Environment.IsPrivilegedProcess)
        {
            return new(isOther: false);
        }

        try
        {
            await ServerProgram.RunAsync(ServerProgram.Of("id", "-u", Name), cancellationToken);
            return new(isOther: true);
        }
        catch (LocalClusterException e)
        {
            throw new LocalClusterException(
                $"PostgreSQL does not run as root, and there is no account '{Name}' to run it as. "
                + "Install the PostgreSQL server, which makes the account, or start this program from an ordinary account.",
                e);
        }
    }

    /// <summary>A program run as this account.</summary>
    public ProcessStartInfo Command(string program, params IEnumerable<string> arguments) => IsOther
        ? ServerProgram.Of("setpriv", [.. Identity, "--", program, .. arguments])
        : ServerProgram.Of(program, arguments);

    /// <summary>
    /// A program run as this account that is told to stop when the thread that started it ends, and that a Ctrl+C at
    /// the terminal does not reach, because it is for the owner of the cluster to stop it last.
    /// </summary>
    public ProcessStartInfo LastingCommand(string program, params IEnumerable<string> arguments) =>
        ServerProgram.Of("setsid", ["setpriv", .. IsOther ? Identity : [], "--pdeathsig=INT", "--", program, .. arguments]);

    /// <summary>Makes a folder that only this account can enter.</summary>
    public Task MakeFolderAsync(string path, CancellationToken cancellationToken) =>
        ServerProgram.RunAsync(ServerProgram.Of("install", ["-d", "-m", "700", .. Ownership, path]), cancellationToken);

    /// <summary>Writes a file that only this account can read.</summary>
    public Task WriteFileAsync(string path, string text, CancellationToken cancellationToken) =>
        ServerProgram.RunAsync(
            ServerProgram.Of("install", ["-m", "600", .. Ownership, "/dev/stdin", path]), cancellationToken, input: text);

    /// <summary>Tells whether this account may pass through the folder.</summary>
    public async Task<bool> CanEnterAsync(string folder, CancellationToken cancellationToken)
    {
        using var test = ServerProgram.Start(Command("test", "-x", folder));
        await test.WaitForExitAsync(cancellationToken);
        return test.ExitCode == 0;
    }

    private static string[] Identity => [$"--reuid={Name}", $"--regid={Name}", "--init-groups"];

    private string[] Ownership => IsOther ? ["-o", Name, "-g", Name] : [];
}
