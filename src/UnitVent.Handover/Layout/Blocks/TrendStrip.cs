using NodaTime;
using UnitVent.Handover.Layout.Paging;

namespace UnitVent.Handover.Layout.Blocks;

/// <summary>Small graphs under each other on one time axis, each with its own scale; drawn to be read in black and white.</summary>
/// <param name="AlternativeText">What the strip shows, in words, for who cannot see it.</param>
/// <param name="Span">The time axis from left to right.</param>
/// <param name="Ticks">The times that are named under the axis.</param>
/// <param name="Marks">The instants at which settings were changed: ticks along the axis.</param>
/// <param name="Lanes">From top to bottom.</param>
internal sealed record TrendStrip(
    string AlternativeText, Interval Span, IReadOnlyList<TimeTick> Ticks, IReadOnlyList<Instant> Marks, IReadOnlyList<TrendLane> Lanes) : Block
{
    public override IEnumerable<Piece> Lay(LayoutArea area)
    {
        var drawing = new TrendDrawing(this, area);
        yield return new Piece(drawing.Height, drawing.Draw);
    }
}

/// <summary>A named time on the axis.</summary>
internal sealed record TimeTick(Instant At, string Text);

/// <summary>One quantity of a trend strip.</summary>
/// <param name="Name">Name and unit.</param>
/// <param name="Style">How the points are joined.</param>
/// <param name="Points">In time order; a point without a value is a gap in the line.</param>
/// <param name="Last">The last value as printed elsewhere on the sheet.</param>
internal sealed record TrendLane(string Name, LaneStyle Style, IReadOnlyList<TrendPoint> Points, string Last);

/// <summary>One point; no value means that nothing is known from here to the next.</summary>
internal sealed record TrendPoint(Instant At, double? Value);

/// <summary>How a lane's points are joined.</summary>
internal enum LaneStyle
{
    /// <summary>Solid lines between filled round markers: measured now and then.</summary>
    Line,

    /// <summary>Dashed steps between open square markers: holds until changed.</summary>
    Step,
}
