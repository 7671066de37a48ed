using PdfSharp.Drawing;
using UnitVent.Handover.Layout.Paging;

namespace UnitVent.Handover.Layout.Blocks;

/// <summary>Two stacks of blocks beside each other, read left first; under each other when together they are higher than a page.</summary>
internal sealed record SideBySide(IReadOnlyList<Block> Left, IReadOnlyList<Block> Right, double LeftShare = 0.5) : Block
{
    private const double Gap = 18;

    public override IEnumerable<Piece> Lay(LayoutArea area)
    {
        var leftWidth = (area.Width - Gap) * LeftShare;
        var left = Stack(Left, area with { Width = leftWidth });
        var right = Stack(Right, area with { Width = area.Width - Gap - leftWidth });
        var height = Math.Max(HeightOf(left), HeightOf(right));
        return height > area.Height
            ? Left.Concat(Right).SelectMany(block => block.Lay(area))
            : [new Piece(height, (canvas, at) =>
            {
                Draw(left, canvas, at);
                Draw(right, canvas, at + new XVector(leftWidth + Gap, 0));
            })
            { Bookmarks = [.. left.Concat(right).SelectMany(piece => piece.Bookmarks)] }];
    }

    private static List<Piece> Stack(IReadOnlyList<Block> blocks, LayoutArea area) =>
        [.. blocks.SelectMany(block => block.Lay(area))];

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
