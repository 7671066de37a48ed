using PdfSharp.Drawing;
using PdfSharp.UniversalAccessibility;
using UnitVent.Handover.Layout.Paging;
using UnitVent.Handover.Layout.Text;

namespace UnitVent.Handover.Layout.Blocks;

/// <summary>Labels and values in columns; each pair is one paragraph to a screen reader. Filled row by row.</summary>
internal sealed record KeyValues(IReadOnlyList<KeyValue> Pairs, int Columns = 1) : Block
{
    private const double ColumnGap = 18;
    private const double LabelGap = 8;
    private const double WidestLabelShare = 0.55;
    private const double Below = 1.5;

    public override IEnumerable<Piece> Lay(LayoutArea area)
    {
        var columnWidth = (area.Width - ((Columns - 1) * ColumnGap)) / Columns;
        var labelWidths = Enumerable.Range(0, Columns).Select(column => LabelWidth(area.Typesetter, column, columnWidth)).ToList();
        foreach (var row in Pairs.Chunk(Columns))
        {
            var cells = row.Select((pair, column) => new Cell(
                column * (columnWidth + ColumnGap),
                labelWidths[column],
                area.Typesetter.Wrap(pair.Label, TextStyle.Body, labelWidths[column] - LabelGap),
                area.Typesetter.Wrap(pair.Value, TextStyle.Body.Emphasised(pair.IsStrong), columnWidth - labelWidths[column]))).ToList();
            var height = (cells.Max(cell => cell.Lines) * TextStyle.Body.LineHeight) + Below;
            yield return new Piece(height, (canvas, at) => cells.ForEach(cell => cell.Draw(canvas, at)));
        }
    }

    private double LabelWidth(Typesetter typesetter, int column, double columnWidth)
    {
        var widest = Pairs.Where((_, i) => i % Columns == column).Max(pair => (double?)typesetter.Line(pair.Label, TextStyle.Body).Width) ?? 0;
        return Math.Min(widest + LabelGap, columnWidth * WidestLabelShare);
    }

    private sealed record Cell(double Left, double LabelWidth, IReadOnlyList<TextLine> Label, IReadOnlyList<TextLine> Value)
    {
        public int Lines => Math.Max(Label.Count, Value.Count);

        public void Draw(Canvas canvas, XPoint at) => canvas.Tagged(PdfBlockLevelElementTag.Paragraph, () =>
        {
            canvas.Lines(Label, at + new XVector(Left, 0));
            canvas.Lines(Value, at + new XVector(Left + LabelWidth, 0));
        });
    }
}

/// <summary>One label and its value.</summary>
internal sealed record KeyValue(string Label, string Value, bool IsStrong = false);
