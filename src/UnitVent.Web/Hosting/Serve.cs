namespace UnitVent.Web.Hosting;

/// <summary>Serves screens and HTTP interface until it is told to stop.</summary>
public static class Serve
{
    /// <param name="Demo">Fill the demo unit first.</param>
    /// <param name="Empty">Print a one-time set-up secret.</param>
    /// <param name="HostArguments">Settings of the host, as <c>--name=value</c>.</param>
    public sealed record Wishes(bool Demo, bool Empty, string[] HostArguments);

    public static async Task<int> RunAsync(Wishes wishes, CancellationToken cancel)
    {
        var builder = WebApplication.CreateBuilder(wishes.HostArguments);
        var settings = HostSettings.From(builder.Configuration);
        await using var database = await Database.OpenAsync(settings, cancel);
        builder.WebHost.UseUrls(settings.Url);
        builder.AddWeb();
        builder.Services.AddSingleton<NodaTime.IClock>(MachineClock.Clock);
        await using var app = builder.Build();
        app.UseWeb();
        await app.RunAsync(cancel);
        return 0;
    }
}
