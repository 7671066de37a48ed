using Microsoft.Playwright;
using UglyToad.PdfPig;
using UnitVent.EndToEnd.Browsing;
using static Microsoft.Playwright.Assertions;

namespace UnitVent.EndToEnd.Journeys;

/// <summary>From an empty bed to the printed sheet, with a second person watching the board.</summary>
[Collection(Chromium.OneAtATime)]
public sealed class AdmitToSheetTests(Ward ward) : IClassFixture<Ward>
{
    private const float LiveWithinMs = 2000;

    [Fact]
    public async Task Patient_AdmittedAndCharted_StandsOnTheBoardAndOnTheSheet_AndOnEverybodysScreen()
    {
        await using var bedside = await ward.PhysicianAsync();
        await using var station = await ward.PhysicianAsync();
        await Expect(station.Page.GetByTestId("empty")).ToBeVisibleAsync();

        await bedside.Page.AdmitAsync("3", "Granit", "E-1001");
        var row = station.Page.GetByTestId("bed-3");
        await Expect(row).ToContainTextAsync("Granit", new() { Timeout = LiveWithinMs });

        await bedside.Page.ChartAprvAsync(minutesAgo: 40);
        await ChartGasAsync(bedside.Page);
        await Expect(Cell(row, "P/F").Locator(".value")).ToHaveTextAsync("142", new() { Timeout = LiveWithinMs }); // 71 ÷ 0.5
        await ChartCheckAsync(bedside.Page);

        await Expect(Cell(row, "End flow")).ToContainTextAsync("55", new() { Timeout = LiveWithinMs }); // 33 ÷ 60
        await Expect(Cell(row, "Own share").Locator(".value")).ToHaveTextAsync("24"); // (6.6 − 0.42 × 12) ÷ 6.6
        await Expect(Cell(row, "Mean")).ToContainTextAsync("25.7"); // (28 × 4.5 + 5 × 0.5) ÷ 5
        await Expect(Cell(row, "Settings")).ToContainTextAsync("APRV 28/5 4.5/0.5");
        await SheetSaysAsync(bedside, "Granit", "142", "25.7");
    }

    private static async Task ChartGasAsync(IPage page)
    {
        var drawer = await page.OpenAsync("Blood gas");
        await drawer.GetByText("Arterial", new() { Exact = true }).ClickAsync();
        await drawer.FillAsync(("Drawn", Bedside.Ago(20)), ("pH", "7,35"), ("pCO2", "45"), ("pO2", "71"));
        await drawer.GetByRole(AriaRole.Button, new() { Name = "Save" }).ClickAsync();
        await Expect(drawer.GetByTestId("problems")).ToContainTextAsync("comma");
        await Expect(drawer.GetByLabel("pH", new() { Exact = true })).ToHaveValueAsync("7,35");

        await drawer.FillAsync(("pH", "7.35"));
        await page.Keyboard.PressAsync("Tab");
        await Expect(drawer.GetByTestId("follows")).ToContainTextAsync("P/F 142");
        await drawer.SaveAsync();
        await Expect(drawer.GetByTestId("saved")).ToContainTextAsync("P/F 142");
        await drawer.DoneAsync();
    }

    private static async Task ChartCheckAsync(IPage page)
    {
        var drawer = await page.OpenAsync("Ventilator check");
        await drawer.FillAsync(
            ("Total minute volume", "6.6"), ("Total rate", "22"), ("Release volume", "420"), ("Releases averaged", "3"),
            ("Peak expiratory flow", "60"), ("End-release flow", "33"), ("Flow readings", "3"), ("SpO2", "93"));
        await drawer.SaveAsync();
        await drawer.DoneAsync();
    }

    private static async Task SheetSaysAsync(Screen screen, params string[] words)
    {
        var link = screen.Page.GetByRole(AriaRole.Link, new() { Name = "Sheet (PDF)" });
        Assert.Equal("_blank", await link.GetAttributeAsync("target"));
        var answer = await screen.Context.APIRequest.GetAsync((await link.GetAttributeAsync("href"))!);
        Assert.True(answer.Ok, answer.StatusText);
        using var sheet = PdfDocument.Open(await answer.BodyAsync());
        var text = string.Join(' ', sheet.GetPages().SelectMany(p => p.GetWords()).Select(w => w.Text));
        Assert.All(words, word => Assert.Contains(word, text, StringComparison.Ordinal));
    }

    private static ILocator Cell(ILocator row, string label) => row.Locator($".numbers [data-label='{label}']");
}
