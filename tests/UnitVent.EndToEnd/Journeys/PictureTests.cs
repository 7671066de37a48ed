using System.Text.RegularExpressions;
using Microsoft.Playwright;
using UnitVent.EndToEnd.Browsing;
using UnitVent.EndToEnd.Served;
using static Microsoft.Playwright.Assertions;

namespace UnitVent.EndToEnd.Journeys;

/// <summary>Takes the pictures of the documentation from the invented unit: <c>UNITVENT_SCREENSHOTS=1</c>.</summary>
[Collection(Chromium.OneAtATime)]
public sealed partial class PictureTests(Chromium chromium) : IDisposable
{
    private readonly string folder = Directory.CreateTempSubdirectory("unitvent-pictures-").FullName;

    public static bool Wanted => Environment.GetEnvironmentVariable("UNITVENT_SCREENSHOTS") == "1";

    public void Dispose() => Directory.Delete(folder, recursive: true);

    [Fact(Skip = "Pictures are taken when UNITVENT_SCREENSHOTS is 1.", SkipUnless = nameof(Wanted))]
    public async Task Screens_OfTheInventedUnit_ArePictured()
    {
        await using var program = await ServedProgram.StartAsync(folder, "--demo");
        var password = Password().Match(program.Output).Groups[1].Value;
        foreach (var (look, width, suffix) in new[] { (ColorScheme.Light, 1280, "light"), (ColorScheme.Dark, 1280, "dark"), (ColorScheme.Light, 390, "phone") })
        {
            await using var screen = await Screen.OpenAsync(chromium.Browser, program.Address, new() { ColorScheme = look, ViewportSize = new() { Width = width, Height = 844 } });
            await screen.SignInAsync("demo.physician", password);
            await PictureAsync(screen.Page, suffix);
        }
    }

    private static async Task PictureAsync(IPage page, string suffix)
    {
        await Expect(page.GetByTestId("board")).ToBeVisibleAsync();
        await TakeAsync(page, "board-" + suffix);
        var first = page.Locator("tbody.patient").First;
        await first.GetByRole(AriaRole.Button).ClickAsync();
        await first.GetByRole(AriaRole.Button, new() { Name = "Blood gas" }).ClickAsync();
        var drawer = page.GetByRole(AriaRole.Dialog);
        await drawer.GetByText("Arterial", new() { Exact = true }).ClickAsync();
        await drawer.FillAsync(("pH", "7.31"), ("pCO2", "52"), ("pO2", "64"));
        await page.Keyboard.PressAsync("Tab");
        await Expect(drawer.GetByTestId("follows")).ToContainTextAsync("P/F");
        await TakeAsync(page, "gas-" + suffix);
        await drawer.GetByRole(AriaRole.Button, new() { Name = "Close" }).ClickAsync();
        await first.Locator("a.name").ClickAsync();
        await Expect(page.Locator("[data-testid=lanes] svg")).ToBeVisibleAsync();
        await TakeAsync(page, "patient-" + suffix);
    }

    private static Task<byte[]> TakeAsync(IPage page, string name) => page.ScreenshotAsync(new() { Path = Path.Combine(Images(), name + ".png") });

    private static string Images()
    {
        var root = new DirectoryInfo(AppContext.BaseDirectory);
        while (!File.Exists(Path.Combine(root.FullName, "UnitVent.sln")))
        {
            root = root.Parent!;
        }

        return Path.Combine(root.FullName, "docs", "images");
    }

    [GeneratedRegex(@"Password of all.*?: (\S+)")]
    private static partial Regex Password();
}
