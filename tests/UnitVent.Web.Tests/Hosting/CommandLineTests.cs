using System.Diagnostics;
using UnitVent.Testing;

namespace UnitVent.Web.Tests.Hosting;

/// <summary>The verbs, each as a process of its own.</summary>
public sealed class CommandLineTests : IAsyncLifetime
{
    private TestDatabase database = null!;

    private static CancellationToken Cancel => TestContext.Current.CancellationToken;

    public async ValueTask InitializeAsync() => database = await TestDatabase.CreateAsync();

    public ValueTask DisposeAsync() => database.DisposeAsync();

    [Fact]
    public async Task Verbs_MakeUnitPersonAndToken_AndPrintOnlyTheAnswer()
    {
        Assert.Equal((0, "WEST", ""), await RunAsync("create-unit", "--code", "WEST", "--name", "West wing", "--time-zone", "Europe/Zurich", "--beds", "1", "2"));
        var (personExit, code, _) = await RunAsync("create-user", "--user", "nora", "--name", "Nora Nurse", "--unit", "WEST", "--role", "nurse");
        Assert.Equal(0, personExit);
        Assert.Matches("^[a-z2-9]{20}$", code);
        var (tokenExit, token, _) = await RunAsync("create-token", "--unit", "WEST", "--role", "chargeTherapist", "--name", "analyser");
        Assert.Equal(0, tokenExit);
        Assert.Matches("^uv_[A-Za-z0-9_-]{43}$", token);
        var (exit, output, error) = await RunAsync("create-token", "--unit", "NOWHERE", "--role", "nurse", "--name", "analyser");
        Assert.Equal((1, ""), (exit, output));
        Assert.Contains("no such unit", error, StringComparison.Ordinal);
    }

    private async Task<(int Exit, string Output, string Error)> RunAsync(params string[] arguments)
    {
        var start = new ProcessStartInfo("dotnet", [typeof(Program).Assembly.Location, .. arguments]) { RedirectStandardOutput = true, RedirectStandardError = true };
        start.Environment["ConnectionStrings__Owner"] = database.OwnerConnectionString;
        start.Environment["ConnectionStrings__Runtime"] = database.RuntimeConnectionString;
        using var process = Process.Start(start)!;
        var (output, error) = (process.StandardOutput.ReadToEndAsync(Cancel), process.StandardError.ReadToEndAsync(Cancel));
        await process.WaitForExitAsync(Cancel);
        return (process.ExitCode, (await output).TrimEnd('\n'), await error);
    }
}
