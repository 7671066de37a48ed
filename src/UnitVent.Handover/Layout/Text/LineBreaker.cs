namespace UnitVent.Handover.Layout.Text;

/// <summary>Breaks text into lines: at spaces, and inside a word only when the word alone is too wide.</summary>
internal static class LineBreaker
{
    public static IEnumerable<IReadOnlyList<Glyph>> Break(IReadOnlyList<Glyph> glyphs, double width)
    {
        var start = 0;
        while (start < glyphs.Count)
        {
            var end = LineEnd(glyphs, start, width);
            yield return Trimmed(glyphs, start, end);
            start = end;
            while (start < glyphs.Count && glyphs[start].IsSpace)
            {
                start++;
            }

            if (start < glyphs.Count && glyphs[start].IsLineEnd)
            {
                start++;
            }
        }
    }

    private static int LineEnd(IReadOnlyList<Glyph> glyphs, int start, double width)
    {
        var (used, lastSpace) = (0.0, start);
        for (var i = start; i < glyphs.Count; i++)
        {
            if (glyphs[i].IsLineEnd)
            {
                return i;
            }

            lastSpace = glyphs[i].IsSpace ? i : lastSpace;
            used += glyphs[i].Width;
            if (used > width && i > start)
            {
                return lastSpace > start ? lastSpace : i;
            }
        }

        return glyphs.Count;
    }

    private static List<Glyph> Trimmed(IReadOnlyList<Glyph> glyphs, int start, int end)
    {
        while (end > start && glyphs[end - 1].IsSpace)
        {
            end--;
        }

        return [.. glyphs.Skip(start).Take(end - start)];
    }
}
