using NodaTime;
using PdfSharp.Drawing;
using UnitVent.Handover.Layout.Paging;
using UnitVent.Handover.Layout.Text;

namespace UnitVent.Handover.Layout.Blocks;

/// <summary>Places and draws a trend strip.</summary>
internal sealed class TrendDrawing
{
    private const double LaneHeight = 27;
    private const double NameHeight = 16;
    private const double MarkHeight = 5;
    private const double Gap = 6;

    private readonly TrendStrip strip;
    private readonly double width;
    private readonly IReadOnlyList<LaneDrawing> lanes;
    private readonly IReadOnlyList<TextLine> ticks;
    private readonly XRect plot;

    public TrendDrawing(TrendStrip strip, LayoutArea area)
    {
        (this.strip, width) = (strip, area.Width);
        lanes = [.. strip.Lanes.Select(lane => new LaneDrawing(lane, area.Typesetter))];
        ticks = [.. strip.Ticks.Select(tick => area.Typesetter.Line(tick.Text, TextStyle.Dense))];
        var left = lanes.Max(lane => lane.ScaleWidth) + Gap;
        var right = lanes.Max(lane => lane.LastWidth) + Gap;
        plot = new XRect(left, 0, width - left - right, lanes.Count * (NameHeight + LaneHeight));
        Height = plot.Bottom + MarkHeight + Gap + TextStyle.Dense.LineHeight;
    }

    public double Height { get; }

    public void Draw(Canvas canvas, XPoint at) =>
        canvas.Figure(strip.AlternativeText, new XRect(at, new XSize(width, Height)), graphics =>
        {
            var area = new XRect(at.X + plot.X, at.Y + plot.Y, plot.Width, plot.Height);
            for (var i = 0; i < lanes.Count; i++)
            {
                var top = area.Y + (i * (NameHeight + LaneHeight)) + NameHeight;
                lanes[i].Draw(canvas, graphics, new XRect(area.X, top, area.Width, LaneHeight), time => XOf(time, area));
            }

            DrawAxis(canvas, graphics, area);
        });

    private void DrawAxis(Canvas canvas, XGraphics graphics, XRect area)
    {
        var thin = new XPen(XColors.Black, Canvas.Hairline);
        var bottom = area.Bottom + MarkHeight + 3;
        graphics.DrawLine(thin, area.X, bottom, area.Right, bottom);
        foreach (var mark in strip.Marks)
        {
            graphics.DrawLine(new XPen(XColors.Black, 1), XOf(mark, area), bottom - MarkHeight, XOf(mark, area), bottom);
        }

        for (var i = 0; i < ticks.Count; i++)
        {
            var x = XOf(strip.Ticks[i].At, area);
            graphics.DrawLine(thin, x, bottom, x, bottom + 2);
            var left = Math.Clamp(x - (ticks[i].Width / 2), area.X, Math.Max(area.X, area.Right - ticks[i].Width));
            canvas.Text(ticks[i], new XPoint(left, bottom + 2));
        }
    }

    private double XOf(Instant time, XRect area) =>
        area.X + (area.Width * ((time - strip.Span.Start).TotalSeconds / strip.Span.Duration.TotalSeconds));
}
