using UnitVent.EndToEnd.Browsing;
using static Microsoft.Playwright.Assertions;

namespace UnitVent.EndToEnd.Journeys;

/// <summary>The program dies under an open page.</summary>
[Collection(Chromium.OneAtATime)]
public sealed class ServerKilledTests(Ward ward) : IClassFixture<Ward>
{
    [Fact]
    public async Task Page_WhoseServerWasKilled_SaysSoVisibly()
    {
        await using var screen = await ward.PhysicianAsync();
        await Expect(screen.Page.GetByTestId("empty")).ToBeVisibleAsync();
        screen.Expect("WebSocket|ERR_CONNECTION_REFUSED|Connection (closed|disconnected)|Failed to (complete negotiation|start the connection|fetch)|reconnect");

        await ward.KillServerAsync();

        var notice = screen.Page.GetByRole(Microsoft.Playwright.AriaRole.Alert).Filter(new() { HasText = "Connection lost" });
        await Expect(notice).ToBeVisibleAsync(new() { Timeout = 10000 });
        await Expect(notice).ToContainTextAsync("What you see is as of");
    }
}
