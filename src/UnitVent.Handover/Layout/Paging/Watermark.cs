using PdfSharp.Drawing;
using UnitVent.Handover.Layout.Text;

namespace UnitVent.Handover.Layout.Paging;

/// <summary>Words across the page, light enough to read over; the head repeats them in black for a copy in pure black and white.</summary>
internal static class Watermark
{
    private const double Points = 50;
    private const double DegreesUp = 52;
    private static readonly XSolidBrush Light = new(XColor.FromGrayScale(0.9));

    public static void Draw(XGraphics graphics, string words, Typesetter typesetter, XRect inside)
    {
        var line = typesetter.Line(words, new TextStyle(Points, true));
        var state = graphics.Save();
        graphics.RotateAtTransform(-DegreesUp, inside.Center);
        var x = inside.Center.X - (line.Width / 2);
        foreach (var run in line.Runs)
        {
            graphics.DrawString(run.Text, run.Font, Light, x, inside.Center.Y + (Points / 3));
            x += run.Width;
        }

        graphics.Restore(state);
    }
}
