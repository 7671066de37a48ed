using UnitVent.Handover.Layout.Text;

namespace UnitVent.Handover.Layout.Blocks;

/// <summary>The widths of a table's columns: natural where no share is asked for, squeezed when they do not fit.</summary>
internal static class ColumnWidths
{
    public const double Gap = 12;

    /// <summary>Keeps rounding from breaking a line that just fits.</summary>
    private const double Slack = 0.01;

    /// <summary>Columns with a share keep at least this part of the table.</summary>
    private const double LeastShared = 0.25;

    public static IReadOnlyList<double> For(Table table, LayoutArea area)
    {
        var room = area.Width - ((table.Columns.Count - 1) * Gap);
        var shares = table.Columns.Sum(column => column.Share);
        var natural = table.Columns.Select((column, i) => column.Share > 0 ? 0 : Natural(table, i, area.Typesetter)).ToList();
        var cap = Cap(natural, shares > 0 ? room * (1 - LeastShared) : room);
        var left = room - natural.Sum(width => Math.Min(width, cap));
        return [.. table.Columns.Select((column, i) => column.Share > 0 ? left * column.Share / shares : Math.Min(natural[i], cap))];
    }

    /// <summary>The width to which the widest columns are cut so that all fit; narrow ones keep theirs.</summary>
    private static double Cap(List<double> widths, double room)
    {
        var (left, count) = (room, widths.Count);
        foreach (var width in widths.Order())
        {
            if (width * count > left)
            {
                return left / count;
            }

            left -= width;
            count--;
        }

        return double.MaxValue;
    }

    private static double Natural(Table table, int column, Typesetter typesetter)
    {
        var head = WidthOf(new Cell(table.Columns[column].Head, IsStrong: true), typesetter);
        return table.Rows.Select(row => WidthOf(row.Cells[column], typesetter)).Append(head).Max() + Slack;
    }

    private static double WidthOf(Cell cell, Typesetter typesetter) =>
        MarkShape.WidthOf(cell.Mark)
        + cell.Text.Split('\n').Max(line => typesetter.Line(line, TextStyle.Dense.Emphasised(cell.IsStrong)).Width);
}
