using Microsoft.Playwright;
using UnitVent.EndToEnd.Browsing;
using static Microsoft.Playwright.Assertions;

namespace UnitVent.EndToEnd.Journeys;

/// <summary>What a shift does with what was raised and with what was charted wrongly.</summary>
[Collection(Chromium.OneAtATime)]
public sealed class ShiftWorkTests(Ward ward) : IClassFixture<Ward>
{
    [Fact]
    public async Task LowOxygen_TakenInHandWithOneTap_SaysWhoOnTheOtherScreen_AndStaysInItsBand()
    {
        await using var bedside = await ward.PhysicianAsync();
        await using var station = await ward.PhysicianAsync();
        await bedside.Page.AdmitAsync("1", "Sumpfdotter", "E-4001");
        await bedside.Page.ChartAprvAsync(minutesAgo: 70);
        var drawer = await bedside.Page.OpenAsync("Blood gas");
        await drawer.GetByText("Arterial", new() { Exact = true }).ClickAsync();
        await drawer.FillAsync(("pH", "7.35"), ("pCO2", "45"), ("pO2", "48"));
        await drawer.SaveAsync();
        await Expect(drawer.GetByTestId("saved")).ToContainTextAsync("Raised:");
        await drawer.DoneAsync();
        await Expect(station.Page.GetByTestId("band-LookNow")).ToBeVisibleAsync();

        await bedside.Page.GetByRole(AriaRole.Button, new() { Name = "Seen, acting" }).First.ClickAsync();

        await Expect(station.Page.GetByTestId("bed-1").Locator(".hand")).ToContainTextAsync("in hand: P. Physician, seen, acting");
        await Expect(station.Page.GetByTestId("band-LookNow")).ToBeVisibleAsync();
    }

    [Fact]
    public async Task Note_CorrectedAndThenStruckOut_StaysReadableWithWhoAndWhy()
    {
        await using var screen = await ward.PhysicianAsync();
        var page = screen.Page;
        await page.AdmitAsync("2", "Wacholder", "E-4002");
        var drawer = await page.OpenAsync("Note");
        await drawer.FillAsync(("Note", "Tube at 21 cm"));
        await drawer.SaveAsync();
        await drawer.DoneAsync();

        await page.GetByTestId("entry-Note").GetByRole(AriaRole.Button, new() { NameRegex = new("^Correct") }).ClickAsync();
        var correction = page.GetByRole(AriaRole.Dialog);
        await correction.FillAsync(("Note", "Tube at 22 cm"));
        await correction.GetByRole(AriaRole.Button, new() { Name = "Save" }).ClickAsync();
        await Expect(correction.GetByTestId("problems")).ToContainTextAsync("reason");
        await correction.FillAsync(("Reason for the correction", "misread"));
        await correction.SaveAsync();
        await correction.DoneAsync();
        await Expect(page.GetByTestId("entry-Note")).ToContainTextAsync("Tube at 22 cm");

        await page.GetByTestId("entry-Note").GetByRole(AriaRole.Button, new() { NameRegex = new("^Strike out") }).ClickAsync();
        await page.GetByRole(AriaRole.Dialog).FillAsync(("Reason", "another patient"));
        await page.GetByRole(AriaRole.Dialog).GetByRole(AriaRole.Button, new() { Name = "Strike out" }).ClickAsync();
        await Expect(page.GetByTestId("entry-Note")).ToHaveCountAsync(0);
        await page.GetByLabel("Show struck out and replaced entries").CheckAsync();
        await Expect(page.GetByTestId("entry-Note").First).ToContainTextAsync("Struck out");
        await Expect(page.GetByTestId("entry-Note").First).ToContainTextAsync("by P. Physician: another patient");
        await Expect(page.GetByTestId("entry-Note").Nth(1)).ToContainTextAsync("Replaced by a correction");
    }
}
