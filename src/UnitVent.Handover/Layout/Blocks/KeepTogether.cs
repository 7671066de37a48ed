using UnitVent.Handover.Layout.Paging;

namespace UnitVent.Handover.Layout.Blocks;

/// <summary>Blocks that stand on one page if a page can hold them.</summary>
internal sealed record KeepTogether(IReadOnlyList<Block> Blocks) : Block
{
    public override IEnumerable<Piece> Lay(LayoutArea area)
    {
        var pieces = Blocks.SelectMany(block => block.Lay(area)).ToList();
        var last = pieces.FindLastIndex(piece => !piece.IsSpace);
        return pieces.Select((piece, i) => i < last ? piece with { KeepWithNext = true } : piece);
    }
}
