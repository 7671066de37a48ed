using System.Diagnostics;
using System.Net;
using System.Net.Sockets;
using System.Text;

namespace UnitVent.EndToEnd.Served;

/// <summary>The program as an operator starts it: a process of its own on a data folder, with its private cluster.</summary>
internal sealed class ServedProgram : IAsyncDisposable
{
    private static readonly TimeSpan Ready = TimeSpan.FromSeconds(90);

    private readonly Process process;
    private readonly StringBuilder output = new();

    private ServedProgram(Process process, Uri address) => (this.process, Address) = (process, address);

    public Uri Address { get; }

    public string Output
    {
        get
        {
            lock (output)
            {
                return output.ToString();
            }
        }
    }

    /// <summary>Starts serving and waits until it is ready.</summary>
    public static Task<ServedProgram> StartAsync(string dataFolder, params string[] arguments) => StartAsync(dataFolder, null, arguments);

    /// <summary>Starts serving from a database server that was given, and waits until it is ready.</summary>
    public static async Task<ServedProgram> StartAsync(string dataFolder, Connections? connections, params string[] arguments)
    {
        var address = new Uri($"http://127.0.0.1:{FreePort()}");
        var program = new ServedProgram(Start(dataFolder, address, ["serve", .. arguments], connections), address);
        program.Listen();
        await program.UntilReadyAsync();
        return program;
    }

    /// <summary>Runs a verb beside a served program.</summary>
    /// <returns>What it printed on standard output, alone.</returns>
    public static async Task<string> SayAsync(string dataFolder, params string[] arguments)
    {
        using var process = Start(dataFolder, null, arguments);
        var (printed, errors) = (process.StandardOutput.ReadToEndAsync(), process.StandardError.ReadToEndAsync());
        await process.WaitForExitAsync(TestContext.Current.CancellationToken);
        Assert.True(process.ExitCode == 0, await errors);
        return await printed;
    }

    /// <summary>Ends it as a power cut would: nothing is flushed, nobody says goodbye.</summary>
    public async Task KillAsync()
    {
        process.Kill();
        await process.WaitForExitAsync(TestContext.Current.CancellationToken);
    }

    /// <summary>Asks it to stop, as a service manager does.</summary>
    public async Task<int> TerminateAsync()
    {
        using var kill = Process.Start("kill", ["-TERM", process.Id.ToString(System.Globalization.CultureInfo.InvariantCulture)]);
        await process.WaitForExitAsync(TestContext.Current.CancellationToken);
        return process.ExitCode;
    }

    public async ValueTask DisposeAsync()
    {
        if (!process.HasExited)
        {
            await TerminateAsync();
        }

        process.Dispose();
    }

    private static Process Start(string dataFolder, Uri? address, string[] arguments, Connections? connections = null)
    {
        var start = new ProcessStartInfo("dotnet", [ProgramFile(), .. arguments]) { RedirectStandardOutput = true, RedirectStandardError = true };
        start.Environment["UNITVENT_DATA"] = dataFolder;
        start.Environment["ConnectionStrings__Owner"] = connections?.Owner;
        start.Environment["ConnectionStrings__Runtime"] = connections?.Runtime;
        start.Environment["UNITVENT_URL"] = address?.ToString();
        return Process.Start(start)!;
    }

    // The program's own output folder, built in the same configuration as this one.
    private static string ProgramFile()
    {
        var output = new DirectoryInfo(AppContext.BaseDirectory);
        var (framework, configuration) = (output.Name, output.Parent!.Name);
        return Path.Combine(output.Parent.Parent!.Parent!.Parent!.Parent!.FullName, "src", "UnitVent.Web", "bin", configuration, framework, "unitvent.dll");
    }

    private static int FreePort()
    {
        using var listener = new TcpListener(IPAddress.Loopback, 0);
        listener.Start();
        return ((IPEndPoint)listener.LocalEndpoint).Port;
    }

    /// <summary>The ways into a database server that was given.</summary>
    internal sealed record Connections(string Owner, string Runtime);

    private void Listen()
    {
        process.OutputDataReceived += (_, e) => Keep(e.Data);
        process.ErrorDataReceived += (_, e) => Keep(e.Data);
        process.BeginOutputReadLine();
        process.BeginErrorReadLine();
    }

    private void Keep(string? line)
    {
        lock (output)
        {
            output.AppendLine(line);
        }
    }

    private async Task UntilReadyAsync()
    {
        using var client = new HttpClient { BaseAddress = Address };
        for (var watch = Stopwatch.StartNew(); watch.Elapsed < Ready && !process.HasExited;)
        {
            try
            {
                using var answer = await client.GetAsync("/readyz", TestContext.Current.CancellationToken);
                if (answer.IsSuccessStatusCode)
                {
                    return;
                }
            }
            catch (HttpRequestException)
            {
                // Not listening yet.
            }

            await Task.Delay(100, TestContext.Current.CancellationToken);
        }

        Assert.Fail("The program did not become ready:\n" + Output);
    }
}
