using PdfSharp.Drawing;

namespace UnitVent.Handover.Layout.Blocks;

/// <summary>Draws the marks that stand before a word.</summary>
internal static class MarkShape
{
    private const double Side = 7.5;
    private const double Gap = 4;

    public static double WidthOf(Mark mark) => mark == Mark.None ? 0 : Side + Gap;

    public static void Draw(XGraphics graphics, Mark mark, XPoint corner)
    {
        var box = new XRect(corner, new XSize(Side, Side));
        var pen = new XPen(XColors.Black, 1);
        switch (mark)
        {
            case Mark.FilledSquare:
                graphics.DrawRectangle(pen, XBrushes.Black, box);
                break;
            case Mark.HalfSquare:
                graphics.DrawRectangle(pen, box);
                graphics.DrawRectangle(XBrushes.Black, box.X, box.Y, Side / 2, Side);
                break;
            case Mark.DashedSquare:
                graphics.DrawRectangle(new XPen(XColors.Black, 1) { DashStyle = XDashStyle.Custom, DashPattern = [1.5, 1.5] }, box);
                break;
            case Mark.OpenCircle:
                graphics.DrawEllipse(pen, box);
                break;
            case Mark.None:
                break;
        }
    }
}
