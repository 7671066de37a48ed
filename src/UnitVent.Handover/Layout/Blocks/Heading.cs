using PdfSharp.Drawing;
using PdfSharp.UniversalAccessibility;
using UnitVent.Handover.Layout.Paging;
using UnitVent.Handover.Layout.Text;

namespace UnitVent.Handover.Layout.Blocks;

/// <summary>A heading, with an aside in body text on the same line, such as the time its data is from.</summary>
internal sealed record Heading(string Text, string Aside = "") : Block
{
    private const double Below = 1;
    private const double Gap = 8;

    public override IEnumerable<Piece> Lay(LayoutArea area)
    {
        var lines = area.Typesetter.Wrap(Text, TextStyle.Heading, area.Width);
        var besides = area.Width - (lines.Count == 1 ? lines[0].Width + Gap : 0);
        var aside = area.Typesetter.Wrap(Aside, TextStyle.Dense, besides);
        yield return Piece.Space(Space.Height) with { KeepWithNext = true };
        var textHeight = lines.Count * TextStyle.Heading.LineHeight;
        var asideTop = lines.Count == 1 ? TextStyle.Heading.Baseline - TextStyle.Dense.Baseline : textHeight;
        var height = Math.Max(textHeight, asideTop + (aside.Count * TextStyle.Dense.LineHeight)) + Below;
        yield return new Piece(height, (canvas, at) =>
        {
            canvas.Tagged(PdfBlockLevelElementTag.Heading2, () => canvas.Lines(lines, at));
            if (aside.Count > 0)
            {
                var asideAt = at + new XVector(area.Width - besides, asideTop);
                canvas.Tagged(PdfBlockLevelElementTag.Paragraph, () => canvas.Lines(aside, asideAt));
            }
        })
        { KeepWithNext = true, Bookmarks = [Text] };
    }
}
