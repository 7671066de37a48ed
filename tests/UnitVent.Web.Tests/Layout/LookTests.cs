using System.Text.RegularExpressions;
using MudBlazor.Utilities;
using UnitVent.Web.Layout;

namespace UnitVent.Web.Tests.Layout;

/// <summary>The components and our own styles show the same colours.</summary>
public sealed partial class LookTests
{
    private static readonly string Css = File.ReadAllText(Path.Combine(Root(), "src/UnitVent.Web/wwwroot/app.css"));

    public static TheoryData<string, string, string> Colours => new()
    {
        { ":root", "ground", UnitVentTheme.Theme.PaletteLight.Background.ToString(MudColorOutputFormats.Hex) },
        { ":root", "ink", UnitVentTheme.Theme.PaletteLight.TextPrimary.ToString(MudColorOutputFormats.Hex) },
        { ":root", "action", UnitVentTheme.Theme.PaletteLight.Primary.ToString(MudColorOutputFormats.Hex) },
        { ":root[data-look=\"dark\"]", "ground", UnitVentTheme.Theme.PaletteDark.Background.ToString(MudColorOutputFormats.Hex) },
        { ":root[data-look=\"dark\"]", "ink", UnitVentTheme.Theme.PaletteDark.TextPrimary.ToString(MudColorOutputFormats.Hex) },
        { ":root[data-look=\"dark\"]", "action", UnitVentTheme.Theme.PaletteDark.Primary.ToString(MudColorOutputFormats.Hex) },
    };

    [Theory]
    [MemberData(nameof(Colours))]
    public void Colour_IsTheSameInStylesAndTheme(string block, string name, string colour) =>
        Assert.Equal(colour, Block(block)["--" + name], ignoreCase: true);

    [Fact]
    public void Dark_IsTheSameBySwitchAndByTheSystemsWish() => Assert.Equal(Block(":root[data-look=\"dark\"]"), Block(":root[data-look=\"auto\"]"));

    /// <summary>WCAG 2.2, 1.4.3: text against its ground 4.5:1 at least.</summary>
    [Theory]
    [InlineData(":root")]
    [InlineData(":root[data-look=\"dark\"]")]
    public void Text_StandsOutFromItsGround(string block)
    {
        var colours = Block(block);
        foreach (var (text, ground) in new[] { ("ink", "ground"), ("ink", "surface"), ("quiet", "ground"), ("quiet", "surface"), ("action", "surface"), ("on-action", "action"), ("ink", "tint") })
        {
            var ratio = Contrast(colours["--" + text], colours["--" + ground]);
            Assert.True(ratio >= 4.5, $"{text} on {ground}: {ratio:0.0}");
        }
    }

    private static Dictionary<string, string> Block(string selector)
    {
        var start = Css.IndexOf(selector + " {", StringComparison.Ordinal);
        var body = Css[start..Css.IndexOf('}', start)];
        return Declaration().Matches(body).ToDictionary(m => m.Groups[1].Value, m => m.Groups[2].Value);
    }

    // WCAG 2.2, definitions of contrast ratio and relative luminance.
    private static double Contrast(string one, string other)
    {
        var (a, b) = (Luminance(one), Luminance(other));
        return (Math.Max(a, b) + 0.05) / (Math.Min(a, b) + 0.05);
    }

    private static double Luminance(string hex)
    {
        var channels = new[] { 1, 3, 5 }.Select(i => Convert.ToInt32(hex.Substring(i, 2), 16) / 255.0).Select(c => c <= 0.04045 ? c / 12.92 : Math.Pow((c + 0.055) / 1.055, 2.4)).ToArray();
        return (0.2126 * channels[0]) + (0.7152 * channels[1]) + (0.0722 * channels[2]);
    }

    private static string Root()
    {
        var folder = new DirectoryInfo(AppContext.BaseDirectory);
        while (!File.Exists(Path.Combine(folder!.FullName, "UnitVent.sln")))
        {
            folder = folder.Parent;
        }

        return folder.FullName;
    }

    [GeneratedRegex("(--[a-z-]+): (#[0-9A-Fa-f]{6});")]
    private static partial Regex Declaration();
}
