using Microsoft.Extensions.DependencyInjection;
using Microsoft.Playwright;
using NodaTime;
using Npgsql;
using UnitVent.EndToEnd.Served;
using UnitVent.Store;
using UnitVent.Store.People;
using UnitVent.Store.Units;
using UnitVent.Testing;

namespace UnitVent.EndToEnd.Browsing;

/// <summary>A unit with beds, a physician and a charge therapist, served by the program from a database of its own. One a test class.</summary>
public sealed class Ward(Chromium chromium) : IAsyncLifetime
{
    public const string Code = "ICU";

    private const string Password = "a long enough password";

    private readonly string folder = Directory.CreateTempSubdirectory("unitvent-ward-").FullName;
    private TestDatabase database = null!;
    private Cable cable = null!;
    private ServedProgram program = null!;

    public Uri Address => program.Address;

    public async ValueTask InitializeAsync()
    {
        database = await TestDatabase.CreateAsync();
        var owner = new NpgsqlConnectionStringBuilder(database.OwnerConnectionString);
        cable = new Cable(owner.Host!, owner.Port);
        await FillAsync();
        program = await ServedProgram.StartAsync(folder, new ServedProgram.Connections(Through(database.OwnerConnectionString), Through(database.RuntimeConnectionString)));
    }

    public Task<Screen> PhysicianAsync(BrowserNewContextOptions? options = null) => SignedInAsync("physician", options);

    public Task<Screen> ChargeTherapistAsync() => SignedInAsync("charge", null);

    public Task<Screen> NobodyAsync() => Screen.OpenAsync(chromium.Browser, Address);

    /// <summary>The database is there, but cannot be reached any more.</summary>
    public void LoseStore() => cable.Pull();

    public void FindStore() => cable.Plug();

    public Task KillServerAsync() => program.KillAsync();

    public async ValueTask DisposeAsync()
    {
        await program.DisposeAsync();
        cable.Dispose();
        await database.DisposeAsync();
        Directory.Delete(folder, recursive: true);
    }

    private async Task FillAsync()
    {
        var services = new ServiceCollection().AddLogging().AddSingleton<NodaTime.IClock>(SystemClock.Instance);
        services.AddUnitVentStore(database.RuntimeConnectionString);
        await using var desks = services.BuildServiceProvider();
        var unit = await desks.GetRequiredService<UnitDesk>().CreateAsync(UserDesk.CommandLine, new NewUnit(Code, "Test unit", "Etc/UTC", ["1", "2", "3", "4"]), CancellationToken.None);
        Assert.True(unit.Succeeded, string.Join(' ', unit.Errors));
        var users = desks.GetRequiredService<UserDesk>();
        foreach (var (userName, name, role) in new[] { ("physician", "P. Physician", UnitRole.Physician), ("charge", "C. Charge", UnitRole.ChargeTherapist) })
        {
            var person = await users.CreateAsync(UserDesk.CommandLine, userName, name, Password, false, CancellationToken.None);
            Assert.True(person.Succeeded, string.Join(' ', person.Errors));
            var member = await users.SetMembershipAsync(UserDesk.CommandLine, person.Value.Id, Code, role, CancellationToken.None);
            Assert.True(member.Succeeded, string.Join(' ', member.Errors));
        }
    }

    private async Task<Screen> SignedInAsync(string userName, BrowserNewContextOptions? options)
    {
        var screen = await Screen.OpenAsync(chromium.Browser, Address, options);
        await screen.SignInAsync(userName, Password);
        return screen;
    }

    private string Through(string connectionString) =>
        new NpgsqlConnectionStringBuilder(connectionString) { Host = "127.0.0.1", Port = cable.Port, Timeout = 3 }.ConnectionString;
}
