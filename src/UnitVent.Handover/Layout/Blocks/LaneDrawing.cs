using NodaTime;
using PdfSharp.Drawing;
using UnitVent.Handover.Layout.Paging;
using UnitVent.Handover.Layout.Text;

namespace UnitVent.Handover.Layout.Blocks;

/// <summary>Draws one lane: its name above, its scale on the left, its last value on the right.</summary>
internal sealed class LaneDrawing
{
    private const double Gap = 6;
    private const double NameGap = 2;
    private const double MarkerRadius = 1.8;
    private static readonly XPen Solid = new(XColors.Black, 1);
    private static readonly XPen Dashed = new(XColors.Black, 1) { DashStyle = XDashStyle.Custom, DashPattern = [3, 2] };

    private readonly TrendLane lane;
    private readonly LaneScale scale;
    private readonly TextLine name;
    private readonly TextLine top;
    private readonly TextLine bottom;
    private readonly TextLine last;

    public LaneDrawing(TrendLane lane, Typesetter typesetter)
    {
        this.lane = lane;
        scale = LaneScale.Around([.. lane.Points.Select(point => point.Value).OfType<double>()]);
        name = typesetter.Line(lane.Name, TextStyle.Dense);
        top = typesetter.Line(scale.TopText, TextStyle.Dense);
        bottom = typesetter.Line(scale.BottomText, TextStyle.Dense);
        last = typesetter.Line(lane.Last, TextStyle.DenseStrong);
    }

    public double ScaleWidth => Math.Max(top.Width, bottom.Width);

    public double LastWidth => last.Width;

    /// <summary>Draws the lane into its box; the name stands above it.</summary>
    public void Draw(Canvas canvas, XGraphics graphics, XRect box, Func<Instant, double> xOf)
    {
        var half = TextStyle.Dense.LineHeight / 2;
        canvas.Text(name, new XPoint(box.X, box.Y - TextStyle.Dense.LineHeight - NameGap));
        canvas.Text(top, new XPoint(box.X - Gap - top.Width, box.Y - half));
        canvas.Text(bottom, new XPoint(box.X - Gap - bottom.Width, box.Bottom - half));
        var faint = new XPen(XColors.Black, 0.25) { DashStyle = XDashStyle.Custom, DashPattern = [1, 6] };
        graphics.DrawLine(faint, box.X, box.Y, box.Right, box.Y);
        graphics.DrawLine(faint, box.X, box.Bottom, box.Right, box.Bottom);
        var points = lane.Points.Select(point => point.Value is { } value ? new XPoint(xOf(point.At), scale.YOf(value, box)) : (XPoint?)null).ToList();
        Join(graphics, points, lane.Points.Select(point => xOf(point.At)).ToList(), box.Right);
        DrawMarkers(graphics, points);
        if (points.OfType<XPoint>().Cast<XPoint?>().LastOrDefault() is { } end)
        {
            var y = Math.Clamp(end.Y - half, box.Y - half, box.Bottom - half);
            canvas.Text(last, new XPoint(box.Right + Gap, y));
        }
    }

    private void Join(XGraphics graphics, List<XPoint?> points, List<double> xs, double right)
    {
        for (var i = 0; i < points.Count; i++)
        {
            if (points[i] is not { } from)
            {
                continue;
            }

            var next = i + 1 < points.Count ? points[i + 1] : null;
            if (lane.Style == LaneStyle.Line && next is { } to)
            {
                graphics.DrawLine(Solid, from, to);
            }
            else if (lane.Style == LaneStyle.Step)
            {
                DrawStep(graphics, from, i + 1 < xs.Count ? xs[i + 1] : right, next?.Y);
            }
        }
    }

    private static void DrawStep(XGraphics graphics, XPoint from, double until, double? nextY)
    {
        graphics.DrawLine(Dashed, from.X, from.Y, until, from.Y);
        if (nextY is { } y)
        {
            graphics.DrawLine(Dashed, until, from.Y, until, y);
        }
    }

    private void DrawMarkers(XGraphics graphics, List<XPoint?> points)
    {
        foreach (var point in points.OfType<XPoint>())
        {
            var box = new XRect(point.X - MarkerRadius, point.Y - MarkerRadius, 2 * MarkerRadius, 2 * MarkerRadius);
            if (lane.Style == LaneStyle.Line)
            {
                graphics.DrawEllipse(XBrushes.Black, box);
            }
            else
            {
                graphics.DrawRectangle(new XPen(XColors.Black, 0.8), XBrushes.White, box);
            }
        }
    }
}
