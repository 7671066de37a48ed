using System.Collections.Concurrent;
using System.Diagnostics;

namespace UnitVent.Store.Cluster;

/// <summary>A running server that this program started.</summary>
internal sealed class PostgresProcess
{
    private const int LinesKept = 20;
    private static readonly TimeSpan Poll = TimeSpan.FromMilliseconds(5);

    private readonly Process process;
    private readonly ConcurrentQueue<string> lastLines = new();

    private PostgresProcess(Process process)
    {
        this.process = process;
        process.ErrorDataReceived += (_, line) => Keep(line.Data);
        process.OutputDataReceived += (_, line) => Keep(line.Data);
        process.BeginErrorReadLine();
        process.BeginOutputReadLine();
    }

    public int Id => process.Id;

    /// <summary>Gets a value indicating whether the server is gone.</summary>
    public bool HasExited => process.HasExited;

    /// <summary>Gets the last words of the server.</summary>
    public string LastWords => string.Join('\n', lastLines);

    /// <summary>Starts the server from a thread of its own.</summary>
    /// <remarks>
    /// Linux sends the signal of <c>PR_SET_PDEATHSIG</c> when the <em>thread</em> that started a process ends (prctl(2)), and
    /// threads of the pool come and go. This one stays until the server ends or this program does.
    /// </remarks>
    public static Task<PostgresProcess> StartAsync(ProcessStartInfo info)
    {
        var started = new TaskCompletionSource<PostgresProcess>(TaskCreationOptions.RunContinuationsAsynchronously);
        new Thread(() => StartAndStay(info, started)) { IsBackground = true, Name = "postgres" }.Start();
        return started.Task;
    }

    /// <summary>Waits until the server takes connections; false when it ended before.</summary>
    public async Task<bool> IsReadyAsync(string data, CancellationToken cancellationToken)
    {
        while (!process.HasExited)
        {
            if (PostmasterPid.Read(data) is { IsReady: true } pid && pid.ProcessId == process.Id)
            {
                return true;
            }

            await Task.Delay(Poll, cancellationToken);
        }

        return false;
    }

    public Task WaitForEndAsync(CancellationToken cancellationToken) => process.WaitForExitAsync(cancellationToken);

    public void Kill() => process.Kill();

    private static void StartAndStay(ProcessStartInfo info, TaskCompletionSource<PostgresProcess> started)
    {
        try
        {
            var server = new PostgresProcess(ServerProgram.Start(info));
            started.SetResult(server);
            server.process.WaitForExit();
        }
        catch (LocalClusterException e)
        {
            started.TrySetException(e);
        }
    }

    private void Keep(string? line)
    {
        if (line is null)
        {
            return;
        }

        lastLines.Enqueue(line);
        if (lastLines.Count > LinesKept)
        {
            lastLines.TryDequeue(out _);
        }
    }
}
