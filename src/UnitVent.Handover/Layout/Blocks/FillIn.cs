using PdfSharp.Drawing;
using PdfSharp.UniversalAccessibility;
using UnitVent.Handover.Layout.Paging;
using UnitVent.Handover.Layout.Text;

namespace UnitVent.Handover.Layout.Blocks;

/// <summary>A box to write in by hand: what it is for, then labels each with a line after it.</summary>
internal sealed record FillIn(string Purpose, IReadOnlyList<string> Labels) : Block
{
    private const double Padding = 5;
    private const double Gap = 4;
    private const double WritingHeight = 20;

    public override IEnumerable<Piece> Lay(LayoutArea area)
    {
        var purpose = area.Typesetter.Wrap(Purpose, TextStyle.Strong, area.Width - (2 * Padding));
        var labels = Labels.Select(label => area.Typesetter.Line(label, TextStyle.Body)).ToList();
        var textHeight = purpose.Count * TextStyle.Body.LineHeight;
        var height = textHeight + WritingHeight + (2 * Padding);
        yield return new Piece(height, (canvas, at) =>
        {
            canvas.Artifact(graphics => graphics.DrawRectangle(new XPen(XColors.Black, Canvas.Hairline), at.X, at.Y, area.Width, height));
            canvas.Tagged(PdfBlockLevelElementTag.Paragraph, () => canvas.Lines(purpose, at + new XVector(Padding, Padding)));
            DrawLabels(canvas, labels, at + new XVector(Padding, Padding + textHeight), area.Width - (2 * Padding));
        });
    }

    private static void DrawLabels(Canvas canvas, List<TextLine> labels, XPoint at, double width)
    {
        var top = WritingHeight - TextStyle.Body.LineHeight;
        var ruleWidth = (width - labels.Sum(label => label.Width + (2 * Gap))) / labels.Count;
        foreach (var label in labels)
        {
            canvas.Tagged(PdfBlockLevelElementTag.Paragraph, () => canvas.Text(label, at + new XVector(0, top)));
            canvas.Rule(at + new XVector(label.Width + Gap, top + TextStyle.Body.Baseline + 1), ruleWidth);
            at += new XVector(label.Width + ruleWidth + (2 * Gap), 0);
        }
    }
}
