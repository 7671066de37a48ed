using PdfSharp.Drawing;

namespace UnitVent.Handover.Layout.Paging;

/// <summary>The measures of a page in points (1/72 in).</summary>
internal sealed record PageShape(double Width, double Height)
{
    public const double Margin = 36;

    public XRect Inside => new(Margin, Margin, Width - (2 * Margin), Height - (2 * Margin));

    public static PageShape Of(Paper paper) => paper switch
    {
        Paper.A4 => new PageShape(595.28, 841.89),
        Paper.Letter => new PageShape(612, 792),
    };
}
