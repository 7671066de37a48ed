using Microsoft.Playwright;
using UnitVent.EndToEnd.Browsing;

[assembly: AssemblyFixture(typeof(Chromium))]

namespace UnitVent.EndToEnd.Browsing;

/// <summary>The browser of the distribution, started once a run.</summary>
public sealed class Chromium : IAsyncLifetime
{
    /// <summary>The collection of all classes with a browser: two at once on two cores only disturb each other.</summary>
    public const string OneAtATime = "browser, one at a time";

    private IPlaywright? driver;

    public IBrowser Browser { get; private set; } = null!;

    public async ValueTask InitializeAsync()
    {
        driver = await Playwright.CreateAsync();
        Browser = await driver.Chromium.LaunchAsync(new()
        {
            ExecutablePath = Environment.GetEnvironmentVariable("UNITVENT_CHROMIUM") ?? "/usr/bin/chromium",
            Args = ["--no-sandbox", "--disable-gpu", "--disable-quic", "--no-first-run", "--disable-background-networking", "--disable-component-update", "--disable-sync"],
        });
    }

    public async ValueTask DisposeAsync()
    {
        await Browser.DisposeAsync();
        driver?.Dispose();
    }
}
