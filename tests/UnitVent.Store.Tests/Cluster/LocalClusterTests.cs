using System.Diagnostics;
using System.Globalization;
using UnitVent.Store.Cluster;
using static UnitVent.Store.Tests.Cluster.ClusterSandbox;

namespace UnitVent.Store.Tests.Cluster;

/// <summary>Whatever ended the run before, the next start works and finds what was committed.</summary>
public sealed class LocalClusterTests : IDisposable
{
    private static readonly TimeSpan Patience = TimeSpan.FromSeconds(30);

    private readonly ClusterSandbox sandbox = new();

    public static bool IsRoot => Environment.IsPrivilegedProcess;

    public void Dispose() => sandbox.Dispose();

    [Fact]
    public async Task Start_AfterStop_FindsTheData()
    {
        await using (var first = await sandbox.StartAsync())
        {
            await LeaveRowAsync(first);
        }

        Assert.False(File.Exists(sandbox.PidFile), "the first server is still there");
        await using var second = await sandbox.StartAsync();
        Assert.Equal("kept", await ReadRowAsync(second));
    }

    [Fact]
    public async Task Start_WhileAnotherHoldsTheFolder_JoinsItsServer()
    {
        await using var owner = await sandbox.StartAsync();
        await using (var joined = await sandbox.StartAsync())
        {
            Assert.False(joined.IsOwner);
            Assert.Equal(owner.Port, joined.Port);
            Assert.Equal(1, await AskAsync<int>(joined.RuntimeConnectionString, "select 1"));
        }

        Assert.Equal(1, await AskAsync<int>(owner.RuntimeConnectionString, "select 1"));
    }

    [Fact]
    public async Task Start_AfterServerWasKilled_FindsTheData()
    {
        await using (var first = await sandbox.StartAsync())
        {
            await LeaveRowAsync(first);
            Kill(first.ProcessId!.Value);
            await first.Ended.WaitAsync(Patience, TestContext.Current.CancellationToken);
        }

        Assert.True(File.Exists(sandbox.PidFile), "a killed server leaves its file");
        await AssertStartFindsRowAsync();
    }

    [Fact]
    public async Task Start_WhenStaleFileNamesALivingStranger_FindsTheData()
    {
        await LeaveStoppedClusterAsync();
        var account = await ServerAccount.ChooseAsync(TestContext.Current.CancellationToken);
        using var stranger = ServerProgram.Start(account.Command("sleep", "60"));
        var lines = new[] { stranger.Id.ToString(CultureInfo.InvariantCulture), sandbox.Data, "0", "5432", "", "127.0.0.1", "" };
        await File.WriteAllLinesAsync(sandbox.PidFile, lines, TestContext.Current.CancellationToken);

        await AssertStartFindsRowAsync();

        Assert.False(stranger.HasExited, "the stranger was stopped");
        stranger.Kill();
    }

    [Fact]
    public async Task Start_AfterOwnerWasKilled_FindsTheServerGoneAndTheData()
    {
        using var owner = await ClusterHolder.StartAsync(sandbox.Folder);
        await using (var joined = await sandbox.StartAsync())
        {
            Assert.False(joined.IsOwner);
            await LeaveRowAsync(joined);
        }

        var server = PostmasterPid.Read(sandbox.Data)!.ProcessId;
        owner.Kill();
        await WaitAsync(() => !Directory.Exists($"/proc/{server}"));

        await AssertStartFindsRowAsync();
    }

    [Fact]
    public async Task Start_WhenServerRunsWithoutAnOwner_StopsItAndFindsTheData()
    {
        await LeaveStoppedClusterAsync();
        var binaries = await PostgresBinaries.FindAsync(null, null, TestContext.Current.CancellationToken);
        var account = await ServerAccount.ChooseAsync(TestContext.Current.CancellationToken);
        var orphan = await PostgresProcess.StartAsync(account.Command(
            binaries.Postgres, ServerSettings.ForServer(durable: true, sandbox.Data, ClusterServer.FreePort())));
        Assert.True(await orphan.IsReadyAsync(sandbox.Data, TestContext.Current.CancellationToken), orphan.LastWords);

        await AssertStartFindsRowAsync();

        Assert.True(orphan.HasExited, "two servers on one folder");
    }

    [Fact]
    public async Task Start_WhenMakingTheClusterWasCutShort_MakesItAnew()
    {
        var half = Directory.CreateDirectory(Path.Combine(sandbox.Folder, "postgres.unfinished", "data"));
        await File.WriteAllTextAsync(Path.Combine(half.FullName, "PG_VERSION"), "15\n", TestContext.Current.CancellationToken);

        await using var cluster = await sandbox.StartAsync();

        Assert.Equal(1, await AskAsync<int>(cluster.RuntimeConnectionString, "select 1"));
        Assert.False(Directory.Exists(half.Parent!.FullName));
    }

    [Fact]
    public async Task Start_AfterOwnerWasKilledMakingTheCluster_MakesItAnew()
    {
        using var owner = ClusterHolder.Start(sandbox.Folder);
        await WaitAsync(() => Directory.Exists(sandbox.Folder) && Directory.GetDirectories(sandbox.Folder, "postgres.unfinished*").Length > 0);
        owner.Kill();

        await using var cluster = await sandbox.StartAsync();

        Assert.True(cluster.IsOwner);
        Assert.Equal(1, await AskAsync<int>(cluster.RuntimeConnectionString, "select 1"));
    }

    [Fact]
    public async Task Start_WithoutServerPrograms_SaysWhatToInstall()
    {
        var options = new LocalClusterOptions(sandbox.Folder, Durable: true) { BinFolder = "/nowhere" };

        var refusal = await Assert.ThrowsAsync<LocalClusterException>(
            () => LocalCluster.StartAsync(options, TestContext.Current.CancellationToken));

        Assert.Contains("apt-get install postgresql", refusal.Message, StringComparison.Ordinal);
        await using var cluster = await sandbox.StartAsync();
    }

    [Fact]
    public async Task Start_PasswordsGoneFromAnOldCluster_AsksForThemBack()
    {
        await LeaveStoppedClusterAsync();
        File.Delete(Path.Combine(sandbox.Folder, "cluster-passwords.json"));

        var refusal = await Assert.ThrowsAsync<LocalClusterException>(sandbox.StartAsync);

        Assert.Contains("from the backup", refusal.Message, StringComparison.Ordinal);
    }

    [Fact(Skip = "only root runs the server as another account", SkipUnless = nameof(IsRoot))]
    public async Task Start_BelowAFolderClosedToTheServer_NamesThatFolder()
    {
        const UnixFileMode Closed = UnixFileMode.UserRead | UnixFileMode.UserWrite | UnixFileMode.UserExecute;
        Directory.CreateDirectory(sandbox.Folder);
        File.SetUnixFileMode(sandbox.Folder, Closed);

        var refusal = await Assert.ThrowsAsync<LocalClusterException>(() => LocalCluster.StartAsync(
            new(Path.Combine(sandbox.Folder, "below"), Durable: true), TestContext.Current.CancellationToken));

        Assert.Contains($"chmod o+x {sandbox.Folder}", refusal.Message, StringComparison.Ordinal);
        Assert.Equal(Closed, File.GetUnixFileMode(sandbox.Folder));
    }

    private async Task LeaveStoppedClusterAsync()
    {
        await using var cluster = await sandbox.StartAsync();
        await LeaveRowAsync(cluster);
    }

    private async Task AssertStartFindsRowAsync()
    {
        await using var cluster = await sandbox.StartAsync();
        Assert.True(cluster.IsOwner);
        Assert.Equal("kept", await ReadRowAsync(cluster));
    }

    private static void Kill(int process)
    {
        using var victim = Process.GetProcessById(process);
        victim.Kill();
    }

    private static async Task WaitAsync(Func<bool> condition)
    {
        var waited = Stopwatch.StartNew();
        while (!condition())
        {
            Assert.True(waited.Elapsed < Patience, "it did not happen");
            await Task.Delay(20, TestContext.Current.CancellationToken);
        }
    }
}
