using UglyToad.PdfPig;
using UglyToad.PdfPig.Content;
using UglyToad.PdfPig.Core;
using UglyToad.PdfPig.Util;

namespace UnitVent.Handover.Tests;

/// <summary>A PDF read back: what stands where on paper. The watermark, which is turned, is left out of the text.</summary>
internal sealed class PrintedSheet
{
    private PrintedSheet(PdfDocument document)
    {
        Document = document;
        Pages = [.. document.GetPages().Select(page => new PrintedPage(page))];
    }

    public PdfDocument Document { get; }

    public IReadOnlyList<PrintedPage> Pages { get; }

    public string Text => string.Join('\n', Pages.Select(page => page.Text));

    public static PrintedSheet Read(byte[] pdf) => new(PdfDocument.Open(pdf));
}

/// <summary>One page read back.</summary>
internal sealed class PrintedPage(Page page)
{
    private const double SameLinePoints = 1;

    public Page Page { get; } = page;

    public IReadOnlyList<Letter> Letters { get; } = [.. page.Letters.Where(letter => letter.TextOrientation == TextOrientation.Horizontal)];

    /// <summary>Gets the words of each line from left to right, lines from top to bottom.</summary>
    public IReadOnlyList<string> Lines => [.. DefaultWordExtractor.Instance.GetWords([.. Letters])
        .GroupBy(word => Math.Round(word.Letters[0].StartBaseLine.Y / SameLinePoints))
        .OrderByDescending(line => line.Key)
        .Select(line => string.Join(' ', line.OrderBy(word => word.BoundingBox.Left).Select(word => word.Text)))];

    public string Text => string.Join('\n', Lines);

    public string TurnedText =>
        string.Concat(Page.Letters.Where(letter => letter.TextOrientation != TextOrientation.Horizontal).Select(letter => letter.Value));

    /// <summary>The ink of a letter, roughly: from a little under its baseline to the height of a capital.</summary>
    public static PdfRectangle BoxOf(Letter letter) => new(
        letter.StartBaseLine.X,
        letter.StartBaseLine.Y - (0.2 * letter.PointSize),
        letter.EndBaseLine.X,
        letter.StartBaseLine.Y + (0.72 * letter.PointSize));
}
