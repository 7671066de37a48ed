using NodaTime;
using UnitVent.Store;
using UnitVent.Store.People;

namespace UnitVent.Web.Hosting;

/// <summary>Serves screens and HTTP interface until it is told to stop.</summary>
public static class Serve
{
    private static readonly TimeSpan StopsWithin = TimeSpan.FromSeconds(5);

    public static async Task<int> RunAsync(Wishes wishes, CancellationToken cancel)
    {
        var builder = WebApplication.CreateBuilder(new WebApplicationOptions { Args = wishes.HostArguments, ContentRootPath = AppContext.BaseDirectory });
        var settings = HostSettings.From(builder.Configuration);
        await using var database = await Database.OpenAsync(settings, cancel);
        await database.MigrateAsync(cancel);
        var signIns = wishes.Demo ? await DemoUnitLoad.RunAsync(database, cancel) : null;
        await using var app = Build(builder, settings, database);
        var secret = wishes.Empty ? await app.Services.GetRequiredService<SetUpDesk>().IssueSecretAsync(cancel) : null;
        await app.StartAsync(cancel);
        Say(app, signIns, secret is { Succeeded: true } ? secret.Value : null);
        await Task.WhenAny(app.WaitForShutdownAsync(cancel), database.Ended);
        await app.StopAsync(CancellationToken.None);
        return database.Ended.IsCompleted && !cancel.IsCancellationRequested && !app.Lifetime.ApplicationStopping.IsCancellationRequested ? Spoken.Failed : 0;
    }

    private static WebApplication Build(WebApplicationBuilder builder, HostSettings settings, Database database)
    {
        builder.WebHost.UseUrls(settings.Url);
        builder.Services.Configure<HostOptions>(host => host.ShutdownTimeout = StopsWithin);
        builder.Services.AddSingleton<IClock>(MachineClock.Clock);
        builder.Services.AddUnitVentStore(database.RuntimeConnection);
        builder.AddWeb();
        var app = builder.Build();
        app.UseWeb();
        return app;
    }

    private static void Say(WebApplication app, string? signIns, string? secret)
    {
        Console.WriteLine($"UnitVent answers at {string.Join(", ", app.Urls)}");
        Console.WriteLine("Plain HTTP works on this machine only; tablets and other machines need a proxy with TLS in front.");
        if (signIns is not null)
        {
            Console.WriteLine(signIns);
        }

        if (secret is not null)
        {
            Console.WriteLine($"Set-up secret, good once, for the page /set-up: {secret}");
        }
    }

    /// <summary>What the command line asks for.</summary>
    /// <param name="Demo">Fill the demo unit first.</param>
    /// <param name="Empty">Print a one-time set-up secret.</param>
    /// <param name="HostArguments">Settings of the host, as <c>--name=value</c>.</param>
    public sealed record Wishes(bool Demo, bool Empty, string[] HostArguments);
}
