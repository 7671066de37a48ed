using UnitVent.Handover.Layout.Paging;

namespace UnitVent.Handover.Layout.Blocks;

/// <summary>Blocks that are left out where they would begin another page.</summary>
internal sealed record IfRoom(IReadOnlyList<Block> Blocks) : Block
{
    public override IEnumerable<Piece> Lay(LayoutArea area) => new KeepTogether(Blocks).Lay(area).Select(piece => piece with { IsDispensable = true });
}
