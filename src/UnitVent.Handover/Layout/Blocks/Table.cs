using PdfSharp.Drawing;
using PdfSharp.UniversalAccessibility;
using UnitVent.Handover.Layout.Paging;
using UnitVent.Handover.Layout.Text;

namespace UnitVent.Handover.Layout.Blocks;

/// <summary>A table whose rows are never split and whose head is repeated on each page.</summary>
/// <param name="Columns">From left to right.</param>
/// <param name="Rows">Each with one cell a column.</param>
/// <param name="IsRuled">Whether a hairline stands under each row, for rows that are read one by one.</param>
internal sealed record Table(IReadOnlyList<Column> Columns, IReadOnlyList<Row> Rows, bool IsRuled = false) : Block
{
    /// <summary>A cell with more lines than this is cut and says so: a row has to fit on a page.</summary>
    private const int MostLines = 40;
    private const string Cut = "… (the rest is in the chart)";

    public override IEnumerable<Piece> Lay(LayoutArea area)
    {
        var widths = ColumnWidths.For(this, area);
        var head = new TableRow(Columns.Select(column => new Cell(column.Head)).ToList(), TextStyle.DenseStrong, this, widths, area.Typesetter);
        var repeated = new Piece(head.Height, (canvas, at) =>
        {
            canvas.Artifact(_ => head.DrawText(canvas, at));
            canvas.Rule(at + new XVector(0, head.Height), area.Width);
        });
        yield return new Piece(head.Height, (canvas, at) =>
        {
            canvas.Begin(PdfBlockLevelElementTag.Table);
            head.Draw(canvas, at, PdfBlockLevelElementTag.TableHeaderCell);
            canvas.Rule(at + new XVector(0, head.Height), area.Width);
        })
        { KeepWithNext = true };
        for (var i = 0; i < Rows.Count; i++)
        {
            var row = new TableRow(Rows[i].Cells, TextStyle.Dense, this, widths, area.Typesetter);
            var isLast = i == Rows.Count - 1;
            yield return new Piece(row.Height, (canvas, at) => DrawRow(canvas, row, at, area.Width, isLast)) { RepeatedHead = repeated };
        }
    }

    /// <summary>The lines of a cell, cut where a page could not hold them.</summary>
    public static IReadOnlyList<TextLine> Lines(string text, TextStyle style, double width, Typesetter typesetter)
    {
        var lines = typesetter.Wrap(text, style, width);
        return lines.Count <= MostLines ? lines : [.. lines.Take(MostLines), .. typesetter.Wrap(Cut, style, width)];
    }

    private void DrawRow(Canvas canvas, TableRow row, XPoint at, double width, bool isLast)
    {
        row.Draw(canvas, at, PdfBlockLevelElementTag.TableDataCell);
        if (IsRuled)
        {
            canvas.Rule(at + new XVector(0, row.Height), width, Canvas.Faint);
        }

        if (isLast)
        {
            canvas.End();
        }
    }
}
