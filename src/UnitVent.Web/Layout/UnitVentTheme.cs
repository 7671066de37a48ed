using MudBlazor;

namespace UnitVent.Web.Layout;

/// <summary>The colours and type of the components. The same colours stand as CSS variables in <c>wwwroot/app.css</c>; a test holds them together.</summary>
public static class UnitVentTheme
{
    /// <summary>The fonts of the machine in front of the reader; nothing is fetched.</summary>
    private static readonly string[] Fonts = ["system-ui", "DejaVu Sans", "sans-serif"];

    public static MudTheme Theme { get; } = new()
    {
        PaletteLight = new PaletteLight
        {
            Background = "#F7F8F6",
            Surface = "#FFFFFF",
            DrawerBackground = "#FFFFFF",
            AppbarBackground = "#FFFFFF",
            AppbarText = "#1B2420",
            TextPrimary = "#1B2420",
            TextSecondary = "#55615B",
            TextDisabled = "#6B766F",
            ActionDefault = "#55615B",
            Primary = "#0B5D66",
            Secondary = "#55615B",
            LinesDefault = "#D9DFDA",
            LinesInputs = "#7B867F",
            Divider = "#D9DFDA",
            TableLines = "#D9DFDA",
        },
        PaletteDark = new PaletteDark
        {
            Background = "#12171A",
            Surface = "#1A2126",
            DrawerBackground = "#1A2126",
            AppbarBackground = "#1A2126",
            AppbarText = "#E6ECE9",
            TextPrimary = "#E6ECE9",
            TextSecondary = "#A3B0AA",
            TextDisabled = "#8A9791",
            ActionDefault = "#A3B0AA",
            Primary = "#6EC6CF",
            PrimaryContrastText = "#0E1A1C",
            Secondary = "#A3B0AA",
            LinesDefault = "#313B41",
            LinesInputs = "#7F8C86",
            Divider = "#313B41",
            TableLines = "#313B41",
        },
        LayoutProperties = new LayoutProperties { DefaultBorderRadius = "4px" },
        Typography = new Typography
        {
            Default = new DefaultTypography { FontFamily = Fonts, FontSize = "0.9375rem", LineHeight = "1.45", LetterSpacing = "normal" },
            Button = new ButtonTypography { FontFamily = Fonts, TextTransform = "none", FontWeight = "600", LetterSpacing = "normal" },
        },
    };
}
