using System.Globalization;
using Npgsql;
using UnitVent.Store.Cluster;
using static UnitVent.Store.Tests.Cluster.ClusterSandbox;

namespace UnitVent.Store.Tests.Cluster;

/// <summary>What every durable cluster is, read off a running one.</summary>
public sealed class DurableClusterTests(RunningCluster running) : IClassFixture<RunningCluster>
{
    private readonly LocalCluster cluster = running.Cluster;

    [Theory]
    [InlineData("data_checksums", "on")]
    [InlineData("fsync", "on")]
    [InlineData("synchronous_commit", "on")]
    [InlineData("full_page_writes", "on")]
    [InlineData("listen_addresses", "127.0.0.1")]
    [InlineData("unix_socket_directories", "")]
    [InlineData("log_error_verbosity", "terse")]
    [InlineData("log_min_error_statement", "panic")]
    public async Task Start_Durable_KeepsChartsSafeAndPrivate(string setting, string expected)
    {
        Assert.Equal(expected, await AskAsync<string>(cluster.SuperuserConnectionString, $"show {setting}"));
    }

    [Fact]
    public async Task Start_EmptyFolder_GivesTheDatabaseToItsOwner()
    {
        Assert.True(cluster.IsOwner);
        Assert.Equal("unitvent_owner", await AskAsync<string>(
            cluster.OwnerConnectionString, "select pg_get_userbyid(datdba)::text from pg_database where datname = current_database()"));
        Assert.False(await AskAsync<bool>(
            cluster.SuperuserConnectionString, "select bool_or(rolsuper) from pg_roles where rolname in ('unitvent_owner', 'unitvent_runtime')"));
    }

    [Theory]
    [InlineData("create table extra (id int)", "a table")]
    [InlineData("create temporary table extra (id int)", "a temporary table")]
    [InlineData("create schema extra", "a schema")]
    [InlineData("create role extra", "a role")]
    public async Task RuntimeRole_DefiningSomething_IsRefused(string statement, string what)
    {
        var refusal = await Assert.ThrowsAsync<PostgresException>(() => TellAsync(cluster.RuntimeConnectionString, statement));
        Assert.True(refusal.SqlState == PostgresErrorCodes.InsufficientPrivilege, $"{what}: {refusal.SqlState}");
    }

    [Fact]
    public async Task SignIn_WrongPassword_IsRefused()
    {
        var wrong = new NpgsqlConnectionStringBuilder(cluster.OwnerConnectionString) { Password = "wrong" };

        var refusal = await Assert.ThrowsAsync<PostgresException>(() => AskAsync<int>(wrong.ConnectionString, "select 1"));
        Assert.Equal(PostgresErrorCodes.InvalidPassword, refusal.SqlState);
    }

    [Fact]
    public void Passwords_AreLongDifferentAndReadableByTheOwnerOnly()
    {
        string[] passwords = [.. new[] { cluster.SuperuserConnectionString, cluster.OwnerConnectionString, cluster.RuntimeConnectionString }
            .Select(c => new NpgsqlConnectionStringBuilder(c).Password!)];
        Assert.Equal(3, passwords.Distinct().Count());
        Assert.All(passwords, p => Assert.True(p.Length * 4 >= 128, "fewer than 128 bits in hexadecimal digits"));
        Assert.Equal(
            UnixFileMode.UserRead | UnixFileMode.UserWrite,
            File.GetUnixFileMode(Path.Combine(running.Folder, "cluster-passwords.json")));
    }

    [Fact]
    public async Task Server_IsNotRootAndIsOutOfReachOfAnInterruptAtTheTerminal()
    {
        var process = cluster.ProcessId!.Value;

        var account = (await File.ReadAllLinesAsync($"/proc/{process}/status", TestContext.Current.CancellationToken))
            .Single(line => line.StartsWith("Uid:", StringComparison.Ordinal)).Split('\t');
        Assert.DoesNotContain("0", account);
        Assert.Equal(process, ProcessGroup(process));
        Assert.NotEqual(ProcessGroup(process), ProcessGroup(Environment.ProcessId));
    }

    private static int ProcessGroup(int process)
    {
        const int AfterCommand = 2; // proc(5): state, parent, process group follow the command, which stands in brackets.
        var stat = File.ReadAllText($"/proc/{process}/stat");
        return int.Parse(stat[(stat.LastIndexOf(')') + 2)..].Split(' ')[AfterCommand], CultureInfo.InvariantCulture);
    }
}
