using PdfSharp.Drawing;

namespace UnitVent.Handover.Layout.Text;

/// <summary>One measured line, as runs of one font each.</summary>
internal sealed record TextLine(TextStyle Style, IReadOnlyList<TextRun> Runs, double Width, bool HasMissing)
{
    public static TextLine From(TextStyle style, IReadOnlyList<Glyph> glyphs)
    {
        var runs = new List<TextRun>();
        foreach (var glyph in glyphs)
        {
            if (runs.Count > 0 && ReferenceEquals(runs[^1].Font, glyph.Font))
            {
                runs[^1] = new TextRun(runs[^1].Text + glyph.Text, glyph.Font, runs[^1].Width + glyph.Width);
            }
            else
            {
                runs.Add(new TextRun(glyph.Text, glyph.Font, glyph.Width));
            }
        }

        return new TextLine(style, runs, glyphs.Sum(glyph => glyph.Width), glyphs.Any(glyph => glyph.IsMissing));
    }
}

/// <summary>Characters in a row that one font draws.</summary>
internal readonly record struct TextRun(string Text, XFont Font, double Width);
