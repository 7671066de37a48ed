using UnitVent.Handover.Layout.Blocks;

namespace UnitVent.Handover.Tests.Layout;

public sealed class TableTests
{
    [Fact]
    public void Head_IsRepeatedOnEveryPageOnce()
    {
        var sheet = Example.Print(Example.LongTable(60));

        Assert.All(sheet.Pages, page => Assert.Single(page.Lines, line => line == "Bed Band Why"));
    }

    [Fact]
    public void Row_IsNeverSplitByAPage()
    {
        var sheet = Example.Print(Example.LongTable(60));

        Assert.All(Enumerable.Range(1, 60), i => Assert.Single(
            sheet.Pages,
            page => page.Text.Contains($"reason{i} ", StringComparison.Ordinal) && page.Text.Contains($"end{i}", StringComparison.Ordinal)));
    }

    [Fact]
    public void Head_NeverStandsAloneAtTheFootOfAPage()
    {
        for (var filler = 45; filler < 52; filler++)
        {
            var sheet = Example.Print([.. Enumerable.Repeat(new Paragraph("filler"), filler), new Heading("Rows"), Example.LongTable(1)]);

            var page = Assert.Single(sheet.Pages, page => page.Lines.Contains("Bed Band Why"));
            Assert.Contains("reason1", page.Text);
            Assert.Contains("Rows", page.Text);
        }
    }

    [Fact]
    public void RightAlignedColumn_EndsAtOneEdge()
    {
        var sheet = Example.Print(new Table([new("PaO2, mmHg", Align.Right), new("Note")], [Row.Of("7", "b"), Row.Of("158", "b")]));

        var letters = sheet.Pages[0].Letters;
        Assert.Equal(letters.First(letter => letter.Value == "7").EndBaseLine.X, letters.First(letter => letter.Value == "8").EndBaseLine.X, 0.1);
    }

    [Fact]
    public void NarrowColumns_KeepTheirWidthBesideAWideOne()
    {
        var sheet = Example.Print(new Table([new("pH", Align.Right), new("Note")], [Row.Of("7.31", new string('w', 200))]));

        Assert.Contains(sheet.Pages[0].Lines, line => line.StartsWith("7.31 w", StringComparison.Ordinal));
    }

    [Fact]
    public void Cell_LongerThanAPageHolds_IsCutAndSaysSo()
    {
        var sheet = Example.Print(new Table([new("Bed"), new("Note", Share: 1)], [Row.Of("4", string.Join(' ', Enumerable.Repeat("word", 2000)))]));

        Assert.Contains("(the rest is in the chart)", sheet.Text);
        SheetAssert.IsInsideMargins(sheet);
    }
}
