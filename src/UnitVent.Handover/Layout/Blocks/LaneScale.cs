using System.Globalization;
using PdfSharp.Drawing;

namespace UnitVent.Handover.Layout.Blocks;

/// <summary>A scale between two round numbers that hold every value; never narrower than two steps.</summary>
internal sealed record LaneScale(double Bottom, double Top, int Decimals)
{
    private static readonly double[] RoundFactors = [1, 2, 5, 10];

    public string TopText => Text(Top);

    public string BottomText => Text(Bottom);

    public static LaneScale Around(IReadOnlyList<double> values)
    {
        var (low, high) = values.Count > 0 ? (values.Min(), values.Max()) : (0, 1);
        var step = RoundStep(Math.Max(high - low, Math.Max(Math.Abs(high), 1) * 0.1) / 2);
        var bottom = Math.Floor(low / step) * step;
        var top = Math.Max(Math.Ceiling(high / step) * step, bottom + (2 * step));
        return new LaneScale(bottom, top, Math.Max(0, -(int)Math.Floor(Math.Log10(step))));
    }

    public double YOf(double value, XRect box) => box.Bottom - (box.Height * ((value - Bottom) / (Top - Bottom)));

    private static double RoundStep(double atLeast)
    {
        var power = Math.Pow(10, Math.Floor(Math.Log10(atLeast)));
        return RoundFactors.First(factor => factor * power >= atLeast * 0.999) * power;
    }

    private string Text(double value) =>
        Math.Round(value, Decimals).ToString("F" + Decimals.ToString(CultureInfo.InvariantCulture), CultureInfo.InvariantCulture)
            .Replace('-', '\u2212');
}
