using PdfSharp.Drawing;
using UnitVent.Handover.Layout.Paging;

namespace UnitVent.Handover.Layout.Blocks;

/// <summary>Two stacks of blocks beside each other, read left first; under each other when together they are higher than half a page.</summary>
internal sealed record SideBySide(IReadOnlyList<Block> Left, IReadOnlyList<Block> Right) : Block
{
    private const double Gap = 18;

    public override IEnumerable<Piece> Lay(LayoutArea area)
    {
        var width = (area.Width - Gap) / 2;
        var left = Stack(Left, area with { Width = width });
        var right = Stack(Right, area with { Width = width });
        var height = Math.Max(HeightOf(left), HeightOf(right));
        return height > area.PieceHeight
            ? Left.Concat(Right).SelectMany(block => block.Lay(area))
            : [Piece.Space(Space.Height) with { KeepWithNext = true }, new Piece(height, (canvas, at) =>
            {
                Draw(left, canvas, at);
                Draw(right, canvas, at + new XVector(width + Gap, 0));
            })
            { Bookmarks = [.. left.Concat(right).SelectMany(piece => piece.Bookmarks)] }];
    }

    private static List<Piece> Stack(IReadOnlyList<Block> blocks, LayoutArea area) =>
        [.. blocks.SelectMany(block => block.Lay(area)).SkipWhile(piece => piece.IsSpace)];

    private static double HeightOf(List<Piece> pieces) => pieces.Sum(piece => piece.Height);

    private static void Draw(List<Piece> pieces, Canvas canvas, XPoint at)
    {
        foreach (var piece in pieces)
        {
            piece.Draw(canvas, at);
            at += new XVector(0, piece.Height);
        }
    }
}
