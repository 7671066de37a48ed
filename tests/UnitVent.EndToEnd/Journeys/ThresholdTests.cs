using Microsoft.Playwright;
using UnitVent.EndToEnd.Browsing;
using static Microsoft.Playwright.Assertions;

namespace UnitVent.EndToEnd.Journeys;

/// <summary>Thresholds that decide over an urgent level are chosen by one person and agreed to by another.</summary>
[Collection(Chromium.OneAtATime)]
public sealed class ThresholdTests(Ward ward) : IClassFixture<Ward>
{
    [Fact]
    public async Task Threshold_OfAnUrgentLevel_IsTried_Chosen_AndHoldsOnceASecondPersonAgrees()
    {
        await using var charge = await ward.ChargeTherapistAsync();
        await using var physician = await ward.PhysicianAsync();
        var page = charge.Page;
        await page.GetByRole(AriaRole.Link, new() { Name = "Rules", Exact = true }).ClickAsync();
        await page.GetByText("R25 low oxygen").ClickAsync();
        var edge = page.GetByLabel("R25, SpO2 under which it is urgent", new() { Exact = true });
        await edge.FillAsync("70");
        await page.GetByLabel("Reason for other thresholds").FillAsync("as the unit's protocol says");
        await page.GetByRole(AriaRole.Button, new() { Name = "Save thresholds" }).ClickAsync();
        await Expect(page.GetByRole(AriaRole.Alert)).ToContainTextAsync("70 is outside 80–94 %");
        await edge.FillAsync("86");
        await page.GetByRole(AriaRole.Button, new() { Name = "Try on the last 7 days" }).ClickAsync();
        await Expect(page.GetByTestId("trial")).ToContainTextAsync("patient-day");
        await page.GetByRole(AriaRole.Button, new() { Name = "Save thresholds" }).ClickAsync();
        await Expect(page.GetByRole(AriaRole.Heading, new() { Name = "Waiting for a second person" })).ToBeVisibleAsync();
        await Expect(page.GetByText("The defaults are in force.")).ToBeVisibleAsync();
        await Expect(page.GetByRole(AriaRole.Button, new() { Name = "Agree", Exact = true })).ToHaveCountAsync(0);

        await physician.Page.GetByRole(AriaRole.Link, new() { Name = "Rules", Exact = true }).ClickAsync();
        await Expect(physician.Page.GetByText("SpO2 under which it is urgent: 88 → 86 %")).ToBeVisibleAsync();
        await physician.Page.GetByRole(AriaRole.Button, new() { Name = "Agree", Exact = true }).ClickAsync();

        await Expect(physician.Page.GetByText("chosen by C. Charge, agreed by P. Physician")).ToBeVisibleAsync();
    }
}
