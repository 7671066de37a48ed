using System.Security.Cryptography;
using System.Text;
using Bunit;
using Microsoft.Extensions.DependencyInjection;
using MudBlazor;
using MudBlazor.Services;
using UnitVent.Web.Hosting;
using UnitVent.Web.Layout;

namespace UnitVent.Web.Tests.Layout;

/// <summary>The content-security policy names the theme's style elements by hash: a changed colour must change the policy.</summary>
public sealed class ThemeStyleTests : BunitContext
{
    public ThemeStyleTests()
    {
        Services.AddMudServices();
        JSInterop.Mode = JSRuntimeMode.Loose;
    }

    [Fact]
    public void Policy_NamesExactlyTheStyleElementsOfBothLooks()
    {
        var written = HashesOf(dark: false).Union(HashesOf(dark: true));
        Assert.True(written.ToHashSet().SetEquals(ContentSecurity.ThemeStyleHashes), "The theme writes:\n" + string.Join('\n', written));
    }

    private IEnumerable<string> HashesOf(bool dark) =>
        Render<MudThemeProvider>(p => p.Add(t => t.Theme, UnitVentTheme.Theme).Add(t => t.IsDarkMode, dark))
            .FindAll("style").Select(s => "sha256-" + Convert.ToBase64String(SHA256.HashData(Encoding.UTF8.GetBytes(s.TextContent))));
}
