using UnitVent.Handover.Layout.Paging;
using UnitVent.Handover.Layout.Text;

namespace UnitVent.Handover.Layout.Blocks;

/// <summary>A part of a sheet, as data; laid out into pieces for a given width.</summary>
internal abstract record Block
{
    public abstract IEnumerable<Piece> Lay(LayoutArea area);
}

/// <summary>The room a block is laid out for, in points: its width, and how high a piece that is never split may be.</summary>
internal sealed record LayoutArea(Typesetter Typesetter, double Width, double PieceHeight);
