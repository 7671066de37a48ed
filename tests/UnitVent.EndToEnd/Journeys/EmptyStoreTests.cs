using System.Text.RegularExpressions;
using Microsoft.Playwright;
using UnitVent.EndToEnd.Browsing;
using UnitVent.EndToEnd.Served;
using static Microsoft.Playwright.Assertions;

namespace UnitVent.EndToEnd.Journeys;

/// <summary>From a program that was just installed to the first patient.</summary>
[Collection(Chromium.OneAtATime)]
public sealed partial class EmptyStoreTests(Chromium chromium) : IDisposable
{
    private readonly string folder = Directory.CreateTempSubdirectory("unitvent-empty-").FullName;

    public void Dispose() => Directory.Delete(folder, recursive: true);

    [Fact]
    public async Task Installation_WithItsOneTimeSecret_GetsAnAdministratorAUnitAndAPatient()
    {
        await using var program = await ServedProgram.StartAsync(folder, "--empty");
        var secret = Secret().Match(program.Output).Groups[1].Value;
        await using var screen = await Screen.OpenAsync(chromium.Browser, program.Address);
        var page = screen.Page;

        await page.GotoAsync("/set-up");
        await page.Locator("form").FillAsync(
            ("Set-up secret", secret), ("Your name, as it stands on entries and sheets", "A. Administrator"), ("User name", "admin"), ("Password", "a long enough password"),
            ("Name of the unit", "First unit"), ("Short code: capitals, digits, hyphens", "FIRST"), ("Time zone, for example Europe/Zurich", "Europe/Zurich"), ("Beds in walking order", "1-3, A"));
        await page.GetByRole(AriaRole.Button, new() { Name = "Set up" }).ClickAsync();
        await Expect(page.GetByRole(AriaRole.Heading, new() { Level = 1 })).Not.ToHaveTextAsync("Set up UnitVent");

        await screen.SignInAsync("admin", "a long enough password");
        await Expect(page.GetByTestId("empty")).ToContainTextAsync("Nobody is ventilated");
        await page.AdmitAsync("A", "Quarzit", "E-3001");
        await page.GetByRole(AriaRole.Link, new() { Name = "Board" }).ClickAsync();
        await Expect(page.GetByTestId("bed-A")).ToContainTextAsync("Quarzit");
    }

    [GeneratedRegex(@"Set-up secret.*?: (\S+)")]
    private static partial Regex Secret();
}
