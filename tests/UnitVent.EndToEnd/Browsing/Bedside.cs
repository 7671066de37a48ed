using System.Globalization;
using Microsoft.Playwright;
using NodaTime;

namespace UnitVent.EndToEnd.Browsing;

/// <summary>What people do at the bedside, in their words: by labels and buttons alone.</summary>
internal static class Bedside
{
    /// <summary>A time of day as it is typed, some minutes ago.</summary>
    public static string Ago(int minutes) =>
        (SystemClock.Instance.GetCurrentInstant() - Duration.FromMinutes(minutes)).InUtc().ToString("d MMM uuuu HH:mm", CultureInfo.InvariantCulture);

    public static async Task AdmitAsync(this IPage page, string bed, string familyName, string mrn)
    {
        await page.GetByRole(AriaRole.Button, new() { Name = "Admit", Exact = true }).ClickAsync();
        var panel = page.GetByRole(AriaRole.Dialog);
        await panel.GetByLabel("Bed", new() { Exact = true }).SelectOptionAsync(bed);
        await panel.FillAsync(("MRN", mrn), ("Family name", familyName), ("Height", "175"), ("Airway secured at", Ago(90)), ("Reason for ventilation", "pneumonia"));
        await panel.GetByText("Male", new() { Exact = true }).ClickAsync();
        await panel.GetByRole(AriaRole.Button, new() { Name = "Admit", Exact = true }).ClickAsync();
        await Assertions.Expect(page.GetByTestId("patient-header")).ToContainTextAsync(familyName);
    }

    /// <summary>Opens a form from the patient's page.</summary>
    public static async Task<ILocator> OpenAsync(this IPage page, string task)
    {
        await page.GetByRole(AriaRole.Navigation, new() { Name = "Chart", Exact = true }).GetByRole(AriaRole.Button, new() { Name = task, Exact = true }).ClickAsync();
        var drawer = page.GetByRole(AriaRole.Dialog, new() { Name = task });
        await Assertions.Expect(drawer.GetByTestId("drawer-patient")).ToBeVisibleAsync();
        return drawer;
    }

    public static async Task FillAsync(this ILocator form, params (string Label, string Text)[] typed)
    {
        foreach (var (label, text) in typed)
        {
            await form.Box(label).FillAsync(text);
        }
    }

    /// <summary>The box with a label, into which something is typed.</summary>
    public static ILocator Box(this ILocator form, string label) =>
        form.GetByLabel(label, new() { Exact = true }).And(form.Page.Locator("input:not([type=radio]), textarea"));

    public static async Task SaveAsync(this ILocator drawer)
    {
        await drawer.GetByRole(AriaRole.Button, new() { Name = "Save", Exact = true }).ClickAsync();
        await Assertions.Expect(drawer.GetByTestId("saved")).ToContainTextAsync("Saved");
    }

    public static async Task DoneAsync(this ILocator drawer)
    {
        await drawer.GetByRole(AriaRole.Button, new() { Name = "Done" }).ClickAsync();
        await Assertions.Expect(drawer).ToBeHiddenAsync();
    }

    /// <summary>APRV 28/5, 4.5/0.5 s, FiO2 0.5: mean 25.7 cmH2O.</summary>
    public static async Task ChartAprvAsync(this IPage page, int minutesAgo)
    {
        var drawer = await page.OpenAsync("Setting change");
        await drawer.GetByLabel("Mode", new() { Exact = true }).SelectOptionAsync("aprv");
        await drawer.FillAsync(("Time of change", Ago(minutesAgo)), ("P high", "28"), ("P low", "5"), ("T high", "4.5"), ("T low", "0.5"), ("FiO2", "0.5"));
        await drawer.SaveAsync();
        await drawer.DoneAsync();
    }
}
