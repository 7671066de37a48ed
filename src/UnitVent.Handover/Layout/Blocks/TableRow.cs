using PdfSharp.Drawing;
using PdfSharp.UniversalAccessibility;
using UnitVent.Handover.Layout.Paging;
using UnitVent.Handover.Layout.Text;

namespace UnitVent.Handover.Layout.Blocks;

/// <summary>A measured row.</summary>
internal sealed class TableRow
{
    public const double Padding = 1.5;

    private const double MarkDrop = 1.2;

    private readonly IReadOnlyList<Placed> cells;

    public TableRow(IReadOnlyList<Cell> cells, TextStyle style, Table table, IReadOnlyList<double> widths, Typesetter typesetter)
    {
        var left = 0.0;
        var placed = new List<Placed>();
        for (var i = 0; i < cells.Count; i++)
        {
            var markWidth = MarkShape.WidthOf(cells[i].Mark);
            var lines = Table.Lines(cells[i].Text, style.Emphasised(cells[i].IsStrong), widths[i] - markWidth, typesetter);
            placed.Add(new Placed(lines, table.Columns[i].Align, left + markWidth, widths[i] - markWidth, cells[i].Mark));
            left += widths[i] + ColumnWidths.Gap;
        }

        this.cells = placed;
        Height = (Math.Max(1, placed.Max(cell => cell.Lines.Count)) * style.LineHeight) + (2 * Padding);
    }

    public double Height { get; }

    public void Draw(Canvas canvas, XPoint at, PdfBlockLevelElementTag tag) => canvas.Tagged(PdfBlockLevelElementTag.TableRow, () =>
    {
        foreach (var cell in cells)
        {
            cell.DrawMark(canvas, at);
            canvas.Tagged(tag, () => cell.DrawText(canvas, at));
        }
    });

    public void DrawText(Canvas canvas, XPoint at)
    {
        foreach (var cell in cells)
        {
            cell.DrawText(canvas, at);
        }
    }

    private sealed record Placed(IReadOnlyList<TextLine> Lines, Align Align, double Left, double Width, Mark Mark)
    {
        public void DrawText(Canvas canvas, XPoint at)
        {
            var top = at.Y + Padding;
            foreach (var line in Lines)
            {
                var indent = Align == Align.Right ? Width - line.Width : 0;
                canvas.Text(line, new XPoint(at.X + Left + indent, top));
                top += line.Style.LineHeight;
            }
        }

        public void DrawMark(Canvas canvas, XPoint at)
        {
            if (Mark != Mark.None)
            {
                var corner = new XPoint(at.X + Left - MarkShape.WidthOf(Mark), at.Y + Padding + MarkDrop);
                canvas.Artifact(graphics => MarkShape.Draw(graphics, Mark, corner));
            }
        }
    }
}
