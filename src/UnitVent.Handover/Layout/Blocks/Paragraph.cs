using PdfSharp.UniversalAccessibility;
using UnitVent.Handover.Layout.Paging;
using UnitVent.Handover.Layout.Text;

namespace UnitVent.Handover.Layout.Blocks;

/// <summary>Running text; a page break never leaves one line of it alone.</summary>
internal sealed record Paragraph(string Text, bool IsStrong = false) : Block
{
    private const double Below = 1;

    public override IEnumerable<Piece> Lay(LayoutArea area)
    {
        var lines = area.Typesetter.Wrap(Text, TextStyle.Body.Emphasised(IsStrong), area.Width);
        for (var i = 0; i < lines.Count; i++)
        {
            var (line, isFirst, isLast) = (lines[i], i == 0, i == lines.Count - 1);
            yield return new Piece(line.Style.LineHeight, (canvas, at) =>
            {
                if (isFirst)
                {
                    canvas.Begin(PdfBlockLevelElementTag.Paragraph);
                }

                canvas.Text(line, at);
                if (isLast)
                {
                    canvas.End();
                }
            })
            { KeepWithNext = !isLast && (isFirst || i == lines.Count - 2) };
        }

        yield return Piece.Space(Below);
    }
}
