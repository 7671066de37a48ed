using UglyToad.PdfPig.Content;
using UglyToad.PdfPig.Core;

namespace UnitVent.Handover.Tests;

/// <summary>What every sheet has to keep, whatever is on it.</summary>
internal static class SheetAssert
{
    private const double MarginPoints = 36;
    private const double TolerancePoints = 0.6;

    public static void IsInsideMargins(PrintedSheet sheet)
    {
        foreach (var page in sheet.Pages)
        {
            Assert.All(page.Letters, letter =>
            {
                var box = PrintedPage.BoxOf(letter);
                Assert.InRange(box.Left, MarginPoints - TolerancePoints, page.Page.Width - MarginPoints);
                Assert.InRange(box.Right, MarginPoints, page.Page.Width - MarginPoints + TolerancePoints);
                Assert.InRange(box.Bottom, MarginPoints - TolerancePoints, page.Page.Height - MarginPoints);
                Assert.InRange(box.Top, MarginPoints, page.Page.Height - MarginPoints + TolerancePoints);
            });
        }
    }

    public static void HasNoOverlaps(PrintedSheet sheet)
    {
        foreach (var page in sheet.Pages)
        {
            var inked = page.Letters.Where(letter => !string.IsNullOrWhiteSpace(letter.Value))
                .Select(letter => (Letter: letter, Box: PrintedPage.BoxOf(letter)))
                .OrderBy(letter => letter.Box.Bottom).ToList();
            var overlaps = inked.SelectMany((letter, i) => inked.Skip(i + 1)
                .TakeWhile(other => other.Box.Bottom < letter.Box.Top)
                .Where(other => Overlap(letter.Box, other.Box))
                .Select(other => $"{Place(letter.Letter)} and {Place(other.Letter)} on page {page.Page.Number}"));
            Assert.Empty(overlaps);
        }
    }

    public static void HasNoSmallText(PrintedSheet sheet) =>
        Assert.All(sheet.Pages.SelectMany(page => page.Letters), letter => Assert.InRange(letter.PointSize, 8.99, 100));

    private static bool Overlap(PdfRectangle a, PdfRectangle b) =>
        Math.Min(a.Right, b.Right) - Math.Max(a.Left, b.Left) > TolerancePoints && Math.Min(a.Top, b.Top) - Math.Max(a.Bottom, b.Bottom) > TolerancePoints;

    private static string Place(Letter letter) => $"'{letter.Value}' at {letter.StartBaseLine.X:F0}, {letter.StartBaseLine.Y:F0}";
}
