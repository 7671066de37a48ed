using System.Diagnostics;
using System.Runtime.CompilerServices;
using UnitVent.Store.Cluster;

namespace UnitVent.Store.Tests.Cluster;

/// <summary>Another process that holds a cluster until it is killed: this test program itself, told so by a variable.</summary>
internal static class ClusterHolder
{
    private const string FolderVariable = "UNITVENT_TEST_HOLD_CLUSTER";

    /// <summary>Starts the process, which may still be far from holding anything.</summary>
    public static Process Start(string folder)
    {
        var info = new ProcessStartInfo("dotnet", [typeof(ClusterHolder).Assembly.Location])
        {
            RedirectStandardInput = true,
            RedirectStandardOutput = true,
        };
        info.Environment[FolderVariable] = folder;
        return Process.Start(info)!;
    }

    /// <summary>Starts the process and waits until its cluster is up.</summary>
    public static async Task<Process> StartAsync(string folder)
    {
        var holder = Start(folder);
        Assert.Equal("holding", await holder.StandardOutput.ReadLineAsync(TestContext.Current.CancellationToken));
        return holder;
    }

    [ModuleInitializer]
    internal static void HoldWhenTold()
    {
        if (Environment.GetEnvironmentVariable(FolderVariable) is { } folder)
        {
            LocalCluster.StartAsync(new(folder, Durable: true), CancellationToken.None).GetAwaiter().GetResult();
            Console.WriteLine("holding");
            Console.In.ReadToEnd(); // Ends with the test process, should that forget to kill this one.
            Environment.Exit(0);
        }
    }
}
