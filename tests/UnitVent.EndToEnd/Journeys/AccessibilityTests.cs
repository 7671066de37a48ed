using Deque.AxeCore.Playwright;
using Microsoft.Playwright;
using UnitVent.EndToEnd.Browsing;
using static Microsoft.Playwright.Assertions;

namespace UnitVent.EndToEnd.Journeys;

/// <summary>Every screen of the bedside in both looks: no finding of axe, no sideways scrolling, and the keyboard reaches the save.</summary>
[Collection(Chromium.OneAtATime)]
public sealed class AccessibilityTests(Ward ward) : IClassFixture<Ward>
{
    private static readonly string[] Drawers =
        ["Blood gas", "Setting change", "Ventilator check", "Pass", "Breathing check", "Airway check", "Event", "Note", "Follow-up", "Circumstance", "Targets", "Phase", "Method"];

    public static TheoryData<ColorScheme, int> Looks => new() { { ColorScheme.Light, 1280 }, { ColorScheme.Dark, 390 } };

    [Theory, MemberData(nameof(Looks))]
    public async Task Screens_InEitherLook_HaveNoFinding(ColorScheme look, int width)
    {
        await using (var nobody = await ward.NobodyAsync())
        {
            await nobody.Page.GotoAsync("/sign-in");
            await CleanAsync(nobody.Page, "sign-in");
        }

        await using var screen = await ward.PhysicianAsync(new() { ColorScheme = look, ViewportSize = new() { Width = width, Height = 844 } });
        var (page, bed) = (screen.Page, width == 1280 ? "1" : "2");
        await page.AdmitAsync(bed, "Schiefer", "E-" + bed);
        await page.ChartAprvAsync(minutesAgo: 30);
        await Expect(page.Locator("[data-testid=lanes] svg")).ToBeVisibleAsync();
        await CleanAsync(page, "patient");
        foreach (var task in width == 1280 ? Drawers : Drawers[..4])
        {
            var drawer = await page.OpenAsync(task);
            await CleanAsync(page, task);
            await drawer.GetByRole(AriaRole.Button, new() { Name = "Close" }).ClickAsync();
            await Expect(drawer).ToBeHiddenAsync();
        }

        await page.GetByRole(AriaRole.Link, new() { Name = "Rules", Exact = true }).ClickAsync();
        await page.Locator("details.rule summary").First.ClickAsync();
        await CleanAsync(page, "rules");
        await page.GetByRole(AriaRole.Link, new() { Name = "Board" }).ClickAsync();
        await page.GetByRole(AriaRole.Button, new() { Name = "Open bed " + bed, Exact = true }).ClickAsync();
        await Expect(page.GetByTestId("details-" + bed)).ToBeVisibleAsync();
        await CleanAsync(page, "board");
        await page.GetByRole(AriaRole.Button, new() { Name = "Admit", Exact = true }).ClickAsync();
        await Expect(page.GetByRole(AriaRole.Dialog)).ToBeVisibleAsync();
        await CleanAsync(page, "admit");
    }

    [Fact]
    public async Task Note_ByKeyboardAlone_IsSaved()
    {
        await using var screen = await ward.PhysicianAsync();
        await screen.Page.AdmitAsync("3", "Feldspat", "E-3");
        var drawer = await screen.Page.OpenAsync("Note");
        await Expect(drawer.Box("Time")).ToBeFocusedAsync();

        await screen.Page.Keyboard.PressAsync("Tab");
        await screen.Page.Keyboard.TypeAsync("Seen");
        await screen.Page.Keyboard.PressAsync("Tab");
        await screen.Page.Keyboard.PressAsync("Enter");

        await Expect(drawer.GetByRole(AriaRole.Button, new() { Name = "Done" })).ToBeFocusedAsync();
        await screen.Page.Keyboard.PressAsync("Escape");
        await Expect(drawer).ToBeHiddenAsync();
    }

    private static async Task CleanAsync(IPage page, string where)
    {
        var found = (await page.RunAxe()).Violations;
        Assert.True(found.Length == 0, where + ": " + string.Join('\n', found.Select(v => $"{v.Id} {v.Help} at {string.Join(", ", v.Nodes.Take(3).Select(n => n.Html))}")));
        var sideways = await page.EvaluateAsync<int>("document.documentElement.scrollWidth - document.documentElement.clientWidth");
        Assert.True(sideways <= 0, $"{where} scrolls sideways by {sideways} px.");
    }
}
