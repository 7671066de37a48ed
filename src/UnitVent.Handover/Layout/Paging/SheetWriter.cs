using PdfSharp.Drawing;
using PdfSharp.Pdf;
using PdfSharp.UniversalAccessibility;
using UnitVent.Handover.Layout.Blocks;
using UnitVent.Handover.Layout.Fonts;
using UnitVent.Handover.Layout.Text;

namespace UnitVent.Handover.Layout.Paging;

/// <summary>Writes a document as a tagged PDF: lays everything out first, so that each page knows how many there are.</summary>
internal sealed class SheetWriter
{
    private readonly SheetDocument sheet;
    private readonly PageShape shape;
    private readonly Typesetter typesetter;
    private readonly PdfDocument pdf;
    private readonly UAManager accessibility;

    private SheetWriter(SheetDocument sheet, PdfDocument pdf, Typesetter typesetter)
    {
        (this.sheet, this.pdf, this.typesetter) = (sheet, pdf, typesetter);
        shape = PageShape.Of(sheet.Paper);
        accessibility = UAManager.ForDocument(pdf);
        accessibility.SetDocumentLanguage("en-GB");
        pdf.Info.Title = sheet.Title;
        pdf.Info.Creator = "UnitVent";
        pdf.Info.CreationDate = sheet.PrintedAt.ToDateTimeUtc();
    }

    public static byte[] Write(SheetDocument sheet, SystemFonts fonts)
    {
        using var measure = XGraphics.CreateMeasureContext(new XSize(1000, 1000), XGraphicsUnit.Point, XPageDirection.Downwards);
        using var pdf = new PdfDocument();
        var writer = new SheetWriter(sheet, pdf, new Typesetter(fonts, measure));
        foreach (var section in sheet.Sections)
        {
            writer.Write(section);
        }

        using var bytes = new MemoryStream();
        pdf.Save(bytes);
        return bytes.ToArray();
    }

    private void Write(SheetSection section)
    {
        var area = new LayoutArea(typesetter, shape.Inside.Width, shape.Inside.Height / 2);
        var pieces = section.Blocks.SelectMany(block => block.Lay(area)).ToList();
        var frame = new FrameLayout(section.Frame, sheet.Watermark, shape, typesetter);
        var pages = Paginator.Spread(pieces, frame.Body.Height);
        for (var i = 0; i < pages.Count; i++)
        {
            WritePage(pages[i], frame, new PageNumber(i + 1, pages.Count), section.Bookmark);
        }
    }

    private void WritePage(IReadOnlyList<PlacedPiece> pieces, FrameLayout frame, PageNumber number, string bookmark)
    {
        var page = pdf.AddPage();
        page.Width = XUnit.FromPoint(shape.Width);
        page.Height = XUnit.FromPoint(shape.Height);
        using var graphics = XGraphics.FromPdfPage(page);
        var canvas = new Canvas(graphics, accessibility.StructureBuilder);
        if (number.IsFirst)
        {
            pdf.Outlines.Add(bookmark, page, opened: true);
        }

        frame.DrawHead(canvas, number);
        foreach (var (piece, top) in pieces)
        {
            foreach (var name in piece.Bookmarks)
            {
                pdf.Outlines[^1].Outlines.Add(name, page, opened: true);
            }

            piece.Draw(canvas, new XPoint(frame.Body.X, frame.Body.Y + top));
        }

        frame.DrawFoot(canvas, number);
    }
}
