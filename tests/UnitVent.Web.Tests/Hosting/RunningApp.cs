using Microsoft.AspNetCore.Hosting;
using Microsoft.AspNetCore.Mvc.Testing;
using Microsoft.Extensions.DependencyInjection;
using Microsoft.Extensions.Logging;
using NodaTime;
using UnitVent.Charting.Results;
using UnitVent.Store.People;
using UnitVent.Store.Units;
using UnitVent.Testing;

namespace UnitVent.Web.Tests.Hosting;

/// <summary>The program as it runs, on a real port over a real database of its own, with two units.</summary>
public sealed class RunningApp : IAsyncLifetime
{
    public const string Unit = "ICU";
    public const string OtherUnit = "OTHER";
    public const string Password = "a long enough password";

    private const int Beds = 400;

    private readonly Factory factory;
    private TestDatabase? database;
    private int lastBed;

    public RunningApp() => factory = new Factory(this);

    public TestClock Clock { get; } = new();

    public CapturedLogs Logs { get; } = new();

    /// <summary>Follows no redirect and keeps no cookie.</summary>
    public HttpClient Http { get; private set; } = null!;

    public Guid UnitId { get; private set; }

    public IServiceProvider Services => factory.Services;

    private static CancellationToken Cancel => TestContext.Current.CancellationToken;

    public async ValueTask InitializeAsync()
    {
        database = await TestDatabase.CreateAsync();
        factory.UseKestrel(0);
        factory.StartServer();
        Http = new HttpClient(new HttpClientHandler { AllowAutoRedirect = false, UseCookies = false }) { BaseAddress = factory.ClientOptions.BaseAddress };
        UnitId = Value(await Desk<UnitDesk>().CreateAsync(UserDesk.CommandLine, new(Unit, "Test unit", "Europe/Zurich", [.. Enumerable.Range(1, Beds).Select(i => $"{i}")]), Cancel));
        Value(await Desk<UnitDesk>().CreateAsync(UserDesk.CommandLine, new(OtherUnit, "Other unit", "Etc/UTC", ["A"]), Cancel));
    }

    public async ValueTask DisposeAsync()
    {
        Http.Dispose();
        await factory.DisposeAsync();
        await DropDatabaseAsync();
    }

    /// <summary>Takes the database away under the running program.</summary>
    public async Task DropDatabaseAsync()
    {
        if (Interlocked.Exchange(ref database, null) is { } present)
        {
            await present.DisposeAsync();
        }
    }

    public T Desk<T>()
        where T : notnull => factory.Services.GetRequiredService<T>();

    /// <summary>A bed that no other test uses.</summary>
    public string FreeBed() => $"{Interlocked.Increment(ref lastBed)}";

    public async Task<string> TokenAsync(UnitRole role, string unit = Unit) =>
        Value(await Desk<TokenDesk>().CreateAsync(UserDesk.CommandLine, unit, role, $"{role} of {unit}", null, Cancel));

    /// <summary>A person with a role in the unit; without a password with a one-time code.</summary>
    public async Task<(Guid Id, string UserName, string Secret)> PersonAsync(UnitRole? role, string? password = Password, bool administers = false)
    {
        var name = "user-" + Guid.NewGuid().ToString("N")[..12];
        var made = Value(await Desk<UserDesk>().CreateAsync(UserDesk.CommandLine, name, "Person " + name, password, administers, Cancel));
        if (role is { } wanted)
        {
            Value(await Desk<UserDesk>().SetMembershipAsync(UserDesk.CommandLine, made.Id, Unit, wanted, Cancel));
        }

        return (made.Id, name, made.Secret);
    }

    public static T Value<T>(Result<T> result) => result.Succeeded ? result.Value : throw new InvalidOperationException(string.Join("; ", result.Errors));

    private sealed class Factory(RunningApp app) : WebApplicationFactory<Program>
    {
        protected override void ConfigureWebHost(IWebHostBuilder builder)
        {
            builder.UseEnvironment("Production");
            builder.UseSetting("ConnectionStrings:Owner", app.database!.OwnerConnectionString);
            builder.UseSetting("ConnectionStrings:Runtime", app.database.RuntimeConnectionString);
            builder.ConfigureServices(services =>
            {
                services.AddSingleton<IClock>(app.Clock);
                services.AddLogging(logging => logging.ClearProviders().AddProvider(app.Logs).AddFilter<CapturedLogs>(null, LogLevel.Information));
            });
        }
    }
}

/// <summary>Tests that share one running program; each uses beds, people and tokens of its own.</summary>
[CollectionDefinition(Name)]
public sealed class AppCollection : ICollectionFixture<RunningApp>
{
    public const string Name = "running app";
}
