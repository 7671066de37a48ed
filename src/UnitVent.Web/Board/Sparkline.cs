using System.Globalization;
using System.Text;
using Microsoft.AspNetCore.Components;
using NodaTime;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Windows;

namespace UnitVent.Web.Board;

/// <summary>The last P/F ratios as a small line: the same scale in every row, gaps as gaps, setting changes as ticks.</summary>
public static class Sparkline
{
    private const int FewestGases = 3;
    private const int MostGases = 8;
    private const double Width = 76;
    private const double Height = 26;
    private const double LowMmHg = 50;
    private const double HighMmHg = 300;

    private static readonly Duration Gap = Duration.FromHours(12);

    /// <summary>The line; null with fewer than three gases.</summary>
    public static MarkupString? Of(PatientPicture picture)
    {
        var gases = picture.Gases.Where(g => g.Values[ValueNames.PfRatio].Value is not null).TakeLast(MostGases).ToList();
        return gases.Count < FewestGases ? null : new MarkupString(Svg(gases, picture));
    }

    private static string Svg(List<PairedGas> gases, PatientPicture picture)
    {
        var (from, to) = (gases[0].Gas.At, gases[^1].Gas.At);
        var changes = picture.Window.Of<UnitVent.Charting.Entries.SettingChange>(UnitVent.Charting.Entries.EntryKind.SettingChange, to).Where(c => c.At >= from);
        var svg = new StringBuilder($"<svg class=\"spark\" viewBox=\"0 0 {N(Width)} {N(Height)}\" width=\"{N(Width)}\" height=\"{N(Height)}\" aria-hidden=\"true\" focusable=\"false\">");
        foreach (var change in changes)
        {
            svg.Append(CultureInfo.InvariantCulture, $"<path d=\"M{N(X(change.At, from, to))} {N(Height - 4)}V{N(Height)}\" class=\"tick\"/>");
        }

        svg.Append(CultureInfo.InvariantCulture, $"<path d=\"{Line(gases, from, to)}\" class=\"line\"/>");
        foreach (var gas in gases)
        {
            svg.Append(CultureInfo.InvariantCulture, $"<circle cx=\"{N(X(gas.Gas.At, from, to))}\" cy=\"{N(Y(gas))}\" r=\"1.6\"/>");
        }

        return svg.Append("</svg>").ToString();
    }

    private static string Line(List<PairedGas> gases, Instant from, Instant to)
    {
        var path = new StringBuilder();
        for (var i = 0; i < gases.Count; i++)
        {
            var gap = i == 0 || gases[i].Gas.At - gases[i - 1].Gas.At > Gap;
            path.Append(CultureInfo.InvariantCulture, $"{(gap ? 'M' : 'L')}{N(X(gases[i].Gas.At, from, to))} {N(Y(gases[i]))}");
        }

        return path.ToString();
    }

    private static double X(Instant at, Instant from, Instant to) => to == from ? Width / 2 : 3 + (Width - 6) * ((at - from) / (to - from));

    private static double Y(PairedGas gas)
    {
        var share = (Math.Clamp(gas.Values[ValueNames.PfRatio].Value!.Value, LowMmHg, HighMmHg) - LowMmHg) / (HighMmHg - LowMmHg);
        return 3 + (Height - 9) * (1 - share);
    }

    private static string N(double value) => value.ToString("0.#", CultureInfo.InvariantCulture);
}
