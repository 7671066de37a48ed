using PdfSharp.Drawing;
using PdfSharp.UniversalAccessibility;
using UnitVent.Handover.Layout.Text;

namespace UnitVent.Handover.Layout.Paging;

/// <summary>The measured head and foot of a section's pages, and the room they leave.</summary>
internal sealed class FrameLayout
{
    private const double HeadShare = 0.68;
    private const double AsideShare = 0.3;
    private const double Gap = 6;
    private const double PageNumberWidth = 80;
    private const string MissingNote = "Some characters could not be printed: no installed font has them.";

    private readonly XRect inside;
    private readonly Typesetter typesetter;
    private readonly string? watermark;
    private readonly IReadOnlyList<TextLine> title;
    private readonly IReadOnlyList<TextLine> detail;
    private readonly IReadOnlyList<TextLine> aside;
    private readonly IReadOnlyList<TextLine> foot;
    private readonly TextLine missingNote;

    public FrameLayout(PageFrame frame, string? watermark, PageShape shape, Typesetter typesetter)
    {
        (inside, this.typesetter, this.watermark) = (shape.Inside, typesetter, watermark);
        title = typesetter.Wrap(frame.Title, TextStyle.Title, inside.Width * HeadShare);
        detail = typesetter.Wrap(frame.Detail, TextStyle.Body, inside.Width * HeadShare);
        aside = typesetter.Wrap(watermark is null ? frame.Aside : $"{frame.Aside}\n{watermark}", TextStyle.Dense, inside.Width * AsideShare);
        foot = [.. frame.Foot.SkipLast(1).SelectMany(line => typesetter.Wrap(line, TextStyle.Dense, inside.Width)),
            .. typesetter.Wrap(frame.Foot[^1], TextStyle.Dense, inside.Width - PageNumberWidth)];
        missingNote = typesetter.Line(MissingNote, TextStyle.Dense);
        var head = Math.Max(HeightOf(title) + HeightOf(detail), HeightOf(aside)) + Gap;
        var footHeight = HeightOf(foot) + (typesetter.HasMissing ? TextStyle.Dense.LineHeight : 0) + Gap;
        Body = new XRect(inside.X, inside.Y + head + Gap, inside.Width, inside.Height - head - footHeight - Gap);
    }

    /// <summary>Gets the room between head and foot.</summary>
    public XRect Body { get; }

    public void DrawHead(Canvas canvas, PageNumber number)
    {
        DrawWatermark(canvas);
        if (number.IsFirst)
        {
            canvas.Tagged(PdfBlockLevelElementTag.Heading1, () => canvas.Lines(title, inside.TopLeft));
            canvas.Tagged(PdfBlockLevelElementTag.Paragraph, () => DrawHeadDetail(canvas));
        }
        else
        {
            canvas.Artifact(_ =>
            {
                canvas.Lines(title, inside.TopLeft);
                DrawHeadDetail(canvas);
            });
        }

        canvas.Rule(new XPoint(inside.X, Body.Y - Gap), inside.Width);
    }

    public void DrawFoot(Canvas canvas, PageNumber number)
    {
        var top = Body.Bottom + Gap;
        canvas.Rule(new XPoint(inside.X, top - (Gap / 2)), inside.Width);
        if (number.IsLast)
        {
            canvas.Tagged(PdfBlockLevelElementTag.Paragraph, () => canvas.Lines(foot, new XPoint(inside.X, top)));
        }
        else
        {
            canvas.Artifact(_ => canvas.Lines(foot, new XPoint(inside.X, top)));
        }

        DrawPageNumber(canvas, number, top + HeightOf(foot) - TextStyle.Dense.LineHeight);
        if (canvas.HasMissing)
        {
            canvas.Artifact(_ => canvas.Text(missingNote, new XPoint(inside.X, top + HeightOf(foot))));
        }
    }

    private void DrawPageNumber(Canvas canvas, PageNumber number, double top)
    {
        var page = typesetter.Line(number.ToString(), TextStyle.DenseStrong);
        canvas.Artifact(_ => canvas.Text(page, new XPoint(inside.Right - page.Width, top)));
    }

    private void DrawWatermark(Canvas canvas)
    {
        if (watermark is null)
        {
            return;
        }

        canvas.Artifact(graphics => Watermark.Draw(graphics, watermark, typesetter, inside));
    }

    private void DrawHeadDetail(Canvas canvas)
    {
        canvas.Lines(detail, inside.TopLeft + new XVector(0, HeightOf(title)));
        var top = inside.Y;
        foreach (var line in aside)
        {
            canvas.Text(line, new XPoint(inside.Right - line.Width, top));
            top += line.Style.LineHeight;
        }
    }

    private static double HeightOf(IReadOnlyList<TextLine> lines) => lines.Sum(line => line.Style.LineHeight);
}
