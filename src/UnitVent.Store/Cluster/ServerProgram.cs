using System.ComponentModel;
using System.Diagnostics;

namespace UnitVent.Store.Cluster;

/// <summary>Another program, run in a bare environment: none of this program's settings and secrets, messages in English.</summary>
internal static class ServerProgram
{
    public static ProcessStartInfo Of(string program, params IEnumerable<string> arguments)
    {
        var info = new ProcessStartInfo(program, arguments)
        {
            WorkingDirectory = "/",
            RedirectStandardInput = true,
            RedirectStandardOutput = true,
            RedirectStandardError = true,
        };
        info.Environment.Clear();
        info.Environment["PATH"] = Environment.GetEnvironmentVariable("PATH");
        info.Environment["LC_ALL"] = "C.UTF-8";
        return info;
    }

    /// <summary>Runs the program to its end and returns what it printed.</summary>
    /// <exception cref="LocalClusterException">It is not installed, or it failed; the message carries its own words.</exception>
    public static async Task<string> RunAsync(ProcessStartInfo info, CancellationToken cancellationToken, string input = "")
    {
        using var process = Start(info);
        await using var killOnCancel = cancellationToken.Register(() => process.Kill(entireProcessTree: true));
        await process.StandardInput.WriteAsync(input.AsMemory(), cancellationToken);
        process.StandardInput.Close();
        var errors = process.StandardError.ReadToEndAsync(cancellationToken);
        var output = await process.StandardOutput.ReadToEndAsync(cancellationToken);
        await process.WaitForExitAsync(cancellationToken);
        return process.ExitCode == 0
            ? output
            : throw new LocalClusterException($"{string.Join(' ', info.ArgumentList.Prepend(info.FileName))} failed: {(await errors).Trim()}");
    }

    /// <summary>Starts the program.</summary>
    /// <exception cref="LocalClusterException">It is not installed.</exception>
    public static Process Start(ProcessStartInfo info)
    {
        try
        {
            return Process.Start(info)!;
        }
        catch (Win32Exception e)
        {
            throw new LocalClusterException($"The program {info.FileName} could not be started: {e.Message}", e);
        }
    }
}
