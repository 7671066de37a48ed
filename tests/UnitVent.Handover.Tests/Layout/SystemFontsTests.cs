using System.Text;
using UnitVent.Handover.Layout.Blocks;
using UnitVent.Handover.Layout.Fonts;
using UnitVent.Handover.Layout.Paging;

namespace UnitVent.Handover.Tests.Layout;

public sealed class SystemFontsTests
{
    private const string Note = "Some characters could not be printed: no installed font has them.";

    /// <summary>The last code point of plane 16, for private use: no font has it.</summary>
    private const string NowhereDrawn = "\U0010FFFD";

    [Fact]
    public void Folder_WithoutFonts_IsRefusedNamingAPackageAndTheVariable()
    {
        var refusal = Assert.Throws<InvalidOperationException>(() => SystemFonts.In([AppContext.BaseDirectory]));

        Assert.Contains("fonts-dejavu-core", refusal.Message);
        Assert.Contains(SystemFonts.FolderVariable, refusal.Message);
    }

    [Theory, InlineData('A'), InlineData('µ'), InlineData('≥'), InlineData('°'), InlineData('−'), InlineData('Ł'), InlineData('ő'), InlineData('→')]
    public void TextFaces_HaveTheCharactersOfASheet(char character)
    {
        Assert.True(SystemFonts.Installed.Regular.Has(new Rune(character)));
        Assert.True(SystemFonts.Installed.Bold.Has(new Rune(character)));
    }

    [Fact]
    public void Name_WithAccents_IsReadBackAsTyped() =>
        Assert.Contains("Zażółć Gęślą Ödön Őszi Ñuñez", Example.Print(new Paragraph("Zażółć Gęślą Ödön Őszi Ñuñez")).Text);

    [Fact]
    public void Character_ThatTheTextFaceLacks_ComesFromAnotherInstalledFont()
    {
        var (installed, character) = WithoutOwnGlyphs();

        var sheet = PrintedSheet.Read(SheetWriter.Write(Example.Document(new Paragraph($"x{character}y")), installed));

        Assert.Contains($"x{character}y", sheet.Text.Replace(" ", "", StringComparison.Ordinal));
        Assert.DoesNotContain(Note, sheet.Text);
    }

    [Fact]
    public void Character_ThatNoFontHas_PrintsTheReplacementAndTheNoteOnItsPageOnly()
    {
        var sheet = Example.Print([new Paragraph($"Name {NowhereDrawn}"), Example.LongTable(60)]);

        Assert.Contains("Name \uFFFD", sheet.Pages[0].Text);
        Assert.Contains(Note, sheet.Pages[0].Text);
        Assert.All(sheet.Pages.Skip(1), page => Assert.DoesNotContain(Note, page.Text));
        SheetAssert.HasNoOverlaps(sheet);
    }

    [Fact]
    public void ControlAndFormatCharacters_AreNotDrawn() =>
        Assert.Contains("abc", Example.Print(new Paragraph("a\u200Bb\u0007\uFEFFc")).Text);

    [Fact]
    public void RegularAndBold_AreEmbeddedOnceEach()
    {
        var sheet = Example.Print(new Paragraph("Łódź 12"), new Paragraph("plain 34"));

        Assert.Equal(2, sheet.Pages[0].Letters.Select(letter => letter.FontName).Distinct().Count());
    }

    /// <summary>The installed fonts with one that lacks Hebrew in the place of the text face, and a Hebrew letter that the real one has.</summary>
    private static (SystemFonts Fonts, string Character) WithoutOwnGlyphs()
    {
        var (fonts, alef) = (SystemFonts.Installed, new Rune('\u05D0'));
        var lacking = Directory.EnumerateFiles("/usr/share/fonts", "*.ttf", SearchOption.AllDirectories)
            .Select(path => new FontFile(path)).First(file => !file.Has(alef) && file.Has(new Rune('x')));
        return (new SystemFonts(lacking, fonts.Bold, [fonts.Regular]), alef.ToString());
    }
}
