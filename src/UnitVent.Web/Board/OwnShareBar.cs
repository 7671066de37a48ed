using System.Globalization;
using Microsoft.AspNetCore.Components;

namespace UnitVent.Web.Board;

/// <summary>The patient's own share of minute ventilation as a bar, with the usual 20–30 % [common practice] marked unless weaning.</summary>
public static class OwnShareBar
{
    private const double Width = 64;
    private const double UsualFrom = 20;
    private const double UsualTo = 30;

    public static MarkupString Of(double percent, bool weaning)
    {
        var usual = weaning ? "" : $"<rect class=\"usual\" x=\"{X(UsualFrom)}\" y=\"0\" width=\"{X(UsualTo - UsualFrom)}\" height=\"10\"/>";
        return new($"<svg class=\"share\" viewBox=\"0 0 {Width} 10\" width=\"{Width}\" height=\"10\" aria-hidden=\"true\" focusable=\"false\">"
            + $"<path class=\"axis\" d=\"M0 9.5H{Width}\"/>{usual}<rect class=\"bar\" x=\"0\" y=\"3\" width=\"{X(Math.Clamp(percent, 0, 100))}\" height=\"4\"/></svg>");
    }

    private static string X(double percent) => (percent / 100 * Width).ToString("0.#", CultureInfo.InvariantCulture);
}
