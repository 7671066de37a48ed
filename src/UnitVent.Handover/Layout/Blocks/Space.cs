using UnitVent.Handover.Layout.Paging;

namespace UnitVent.Handover.Layout.Blocks;

/// <summary>White space between blocks that have no heading; dropped at the top of a page.</summary>
internal sealed record Space : Block
{
    public const double Height = 7;

    public override IEnumerable<Piece> Lay(LayoutArea area) => [Piece.Space(Height)];
}
