using System.Globalization;
using System.Text;
using PdfSharp.Drawing;
using UnitVent.Handover.Layout.Fonts;

namespace UnitVent.Handover.Layout.Text;

/// <summary>Turns text into measured lines, character by character in the first font that has it.</summary>
internal sealed class Typesetter(SystemFonts fonts, XGraphics measure)
{
    private static readonly Rune Replacement = Rune.ReplacementChar;
    private readonly Dictionary<(Rune, TextStyle), Glyph> known = [];

    /// <summary>Gets whether anything set so far stands for a character that no installed font has.</summary>
    public bool HasMissing { get; private set; }

    public IReadOnlyList<TextLine> Wrap(string text, TextStyle style, double width) =>
        [.. LineBreaker.Break(Glyphs(text, style), width).Select(line => TextLine.From(style, line))];

    public TextLine Line(string text, TextStyle style) => TextLine.From(style, Glyphs(text.Replace('\n', ' '), style));

    private List<Glyph> Glyphs(string text, TextStyle style) =>
        [.. text.ReplaceLineEndings("\n").Replace('\t', ' ').EnumerateRunes().Where(IsDrawn).Select(character => Glyph(character, style))];

    private static bool IsDrawn(Rune character) =>
        character.Value == '\n' || Rune.GetUnicodeCategory(character) is not (UnicodeCategory.Control or UnicodeCategory.Format);

    private Glyph Glyph(Rune character, TextStyle style)
    {
        if (!known.TryGetValue((character, style), out var glyph))
        {
            glyph = Measured(character, style);
            known.Add((character, style), glyph);
            HasMissing |= glyph.IsMissing;
        }

        return glyph;
    }

    private Glyph Measured(Rune character, TextStyle style)
    {
        if (character.Value == '\n')
        {
            return new Glyph("\n", fonts.Regular.At(style.Points), 0, false);
        }

        var file = fonts.For(character, style.IsBold);
        var drawn = file is not null ? character : fonts.For(Replacement, style.IsBold) is null ? new Rune('?') : Replacement;
        var font = (file ?? fonts.For(drawn, style.IsBold) ?? fonts.Regular).At(style.Points);
        var text = drawn.ToString();
        return new Glyph(text, font, measure.MeasureString(text, font).Width, IsMissing: drawn == Replacement || file is null);
    }
}
