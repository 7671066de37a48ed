using System.Text.RegularExpressions;
using Microsoft.Playwright;

namespace UnitVent.EndToEnd.Browsing;

/// <summary>One browser in front of one person. It fails its test on anything that the console calls an error, a blocked style or script included.</summary>
public sealed class Screen : IAsyncDisposable
{
    private readonly List<string> errors = [];
    private Regex? expected;

    private Screen(IBrowserContext context, IPage page) => (Context, Page) = (context, page);

    public IBrowserContext Context { get; }

    public IPage Page { get; }

    public static async Task<Screen> OpenAsync(IBrowser browser, Uri address, BrowserNewContextOptions? options = null)
    {
        options ??= new() { ViewportSize = new() { Width = 1280, Height = 900 } };
        options.BaseURL = address.ToString();
        var context = await browser.NewContextAsync(options);
        var screen = new Screen(context, await context.NewPageAsync());
        screen.Page.Console += (_, message) => screen.Keep(message.Type == "error", message.Text);
        screen.Page.PageError += (_, error) => screen.Keep(true, error);
        return screen;
    }

    /// <summary>Errors of this shape belong to the story: a server that was killed cannot be reached.</summary>
    public void Expect(string pattern) => expected = new Regex(pattern);

    public async Task SignInAsync(string userName, string password)
    {
        await Page.GotoAsync("/");
        await Page.GetByLabel("User name").FillAsync(userName);
        await Page.GetByLabel("Password").FillAsync(password);
        await Page.GetByRole(AriaRole.Button, new() { Name = "Sign in" }).ClickAsync();
        await Assertions.Expect(Page.GetByRole(AriaRole.Heading, new() { Level = 1 })).Not.ToHaveTextAsync("Sign in");
    }

    public async ValueTask DisposeAsync()
    {
        await Context.DisposeAsync();
        Assert.True(errors.Count == 0, "The console spoke of errors:\n" + string.Join('\n', errors));
    }

    private void Keep(bool isError, string text)
    {
        if (isError && expected?.IsMatch(text) != true)
        {
            errors.Add(text);
        }
    }
}
