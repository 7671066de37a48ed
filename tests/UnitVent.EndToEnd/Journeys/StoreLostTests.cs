using Microsoft.Playwright;
using UnitVent.EndToEnd.Browsing;
using static Microsoft.Playwright.Assertions;

namespace UnitVent.EndToEnd.Journeys;

/// <summary>The database goes away while somebody types, and comes back.</summary>
[Collection(Chromium.OneAtATime)]
public sealed class StoreLostTests(Ward ward) : IClassFixture<Ward>
{
    private const float BackWithinMs = 15000;

    [Fact]
    public async Task Store_LostWhileTyping_KeepsTheForm_SaysHowOldTheScreenIs_AndTakesTheEntryOnceWhenItIsBack()
    {
        await using var bedside = await ward.PhysicianAsync();
        await using var station = await ward.PhysicianAsync();
        await bedside.Page.AdmitAsync("1", "Basalt", "E-2001");
        await Expect(station.Page.GetByTestId("bed-1")).ToBeVisibleAsync();
        var drawer = await bedside.Page.OpenAsync("Note");
        await drawer.FillAsync(("Note", "Turned to the left at the change of shift"));

        ward.LoseStore();
        await drawer.GetByRole(AriaRole.Button, new() { Name = "Save" }).ClickAsync();
        await Expect(drawer.GetByTestId("save-state")).ToContainTextAsync("Not saved", new() { Timeout = BackWithinMs });
        await Expect(drawer.Box("Note")).ToHaveValueAsync("Turned to the left at the change of shift");
        await Expect(station.Page.GetByTestId("not-connected")).ToContainTextAsync("What you see is from then", new() { Timeout = BackWithinMs });
        await Expect(station.Page.GetByTestId("bed-1")).ToBeVisibleAsync();

        ward.FindStore();
        await Expect(station.Page.GetByTestId("not-connected")).ToBeHiddenAsync(new() { Timeout = BackWithinMs });
        await drawer.GetByRole(AriaRole.Button, new() { Name = "Try again" }).ClickAsync();
        await Expect(drawer.GetByTestId("saved")).ToBeVisibleAsync(new() { Timeout = BackWithinMs });
        await drawer.DoneAsync();
        await Expect(bedside.Page.GetByTestId("entry-Note")).ToHaveCountAsync(1);
    }
}
