using UglyToad.PdfPig.Tokens;
using UnitVent.Handover.Layout.Blocks;
using UnitVent.Handover.Layout.Fonts;
using UnitVent.Handover.Layout.Paging;

namespace UnitVent.Handover.Tests.Layout;

public sealed class SheetWriterTests
{
    private static readonly string Unbroken = new('X', 300);

    private static readonly Block[] Everything =
    [
        new Heading("Settings", "in force since 06:10"),
        new SideBySide([new KeyValues([new("Mode", "APRV"), new(Unbroken, Unbroken)])], [new Heading("Now"), new KeyValues([new("SpO2", "93 %")])]),
        new Paragraph(Unbroken),
        new KeyValues([new("Reason", "Pneumonia"), new("PBW", "68.4 kg"), new("Day", "4")], Columns: 2),
        Example.LongTable(25),
        new Table([new("Name"), new("Value", Align.Right)], [Row.Of(Unbroken, Unbroken)], IsRuled: true),
        new KeepTogether([new Heading("Trend"), Example.Strip(new(Example.Morning, 190), new(Example.Morning + NodaTime.Duration.FromHours(22), 158))]),
        new FillIn("Said back by who takes over.", ["Gives", "Takes", "Time"]),
    ];

    [Theory, InlineData(Paper.A4, 595), InlineData(Paper.Letter, 612)]
    public void Sheet_WithEverything_StaysInsideItsMarginsAndOverlapsNowhere(Paper paper, int widthPoints)
    {
        var sheet = Example.Print(Example.Document(Everything) with { Paper = paper });

        Assert.Equal(widthPoints, sheet.Pages[0].Page.Width, 0.5);
        SheetAssert.IsInsideMargins(sheet);
        SheetAssert.HasNoOverlaps(sheet);
        SheetAssert.HasNoSmallText(sheet);
    }

    [Fact]
    public void Text_WithoutASpace_IsPrintedWhole()
    {
        var sheet = Example.Print(new Paragraph(Unbroken), new Table([new("Name"), new("Note", Share: 1)], [Row.Of("a", Unbroken)]));

        Assert.Equal(600, sheet.Text.Count(character => character == 'X'));
    }

    [Fact]
    public void EveryPage_SaysWhoseItIsAndWhichOfHowMany()
    {
        var sheet = Example.Print(Example.LongTable(60));

        Assert.True(sheet.Pages.Count > 1);
        Assert.All(sheet.Pages, (page, i) =>
        {
            Assert.Contains("Bed 4 · Anna Example", page.Text);
            Assert.Contains("MRN 12345", page.Text);
            Assert.Contains("From charting, not monitoring.", page.Text);
            Assert.Contains($"Page {i + 1} of {sheet.Pages.Count}", page.Text);
        });
    }

    [Fact]
    public void Sections_HaveTheirOwnPageNumbers()
    {
        var document = Example.Document(new Paragraph("first"));
        var sheet = Example.Print(document with { Sections = [.. document.Sections, .. document.Sections] });

        Assert.Equal(2, sheet.Pages.Count);
        Assert.All(sheet.Pages, page => Assert.Contains("Page 1 of 1", page.Text));
    }

    [Fact]
    public void Watermark_Given_StandsAcrossEveryPageAndInItsHead()
    {
        var sheet = Example.Print(Example.Document(Example.LongTable(60)) with { Watermark = "DEMONSTRATION DATA" });

        Assert.All(sheet.Pages, page =>
        {
            Assert.Contains("DEMONSTRATION", page.TurnedText);
            Assert.Contains("DEMONSTRATION DATA", page.Text);
        });
    }

    [Fact]
    public void Watermark_NotGiven_IsNowhere() => Assert.Empty(Example.Print(new Paragraph("text")).Pages[0].TurnedText);

    [Fact]
    public void Document_IsTaggedWithLanguageAndTitle()
    {
        var document = Example.Print(Everything).Document;
        var catalogue = document.Structure.Catalog.CatalogDictionary;

        Assert.Equal("Handover, bed 4", document.Information.Title);
        Assert.Equal("en-GB", ((StringToken)catalogue.Data["Lang"]).Data);
        Assert.True(catalogue.ContainsKey(NameToken.StructTreeRoot));
        Assert.True(((BooleanToken)Resolved(catalogue.Data["MarkInfo"]).Data["Marked"]).Data);

        DictionaryToken Resolved(IToken token) => token as DictionaryToken
            ?? (DictionaryToken)document.Structure.GetObject(((IndirectReferenceToken)token).Data).Data;
    }

    [Fact]
    public void Headings_AreBookmarksUnderTheirSection()
    {
        Assert.True(Example.Print(Everything).Document.TryGetBookmarks(out var bookmarks));

        var section = Assert.Single(bookmarks.Roots);
        Assert.Equal("Bed 4", section.Title);
        Assert.Equal(["Settings", "Now", "Trend"], section.Children.Select(child => child.Title));
    }

    [Fact]
    public void OnePage_WithTwoHundredCells_TakesAtMost80Kilobytes()
    {
        var rows = Enumerable.Range(0, 25).Select(i => new Row([.. Enumerable.Repeat<Cell>($"{i}", 8)]));
        var table = new Table([.. "abcdefgh".Select(name => new Column($"{name}"))], [.. rows]);
        var pangram = new Paragraph("The quick brown fox jumps over the lazy dog, 0123456789 %·→−.");
        var document = Example.Document(table, Example.Strip(new TrendPoint(Example.Morning, 158)), pangram);

        var bytes = SheetWriter.Write(document, SystemFonts.Installed);

        Assert.Single(PrintedSheet.Read(bytes).Pages);
        Assert.InRange(bytes.Length, 1, 80 * 1024);
    }
}
