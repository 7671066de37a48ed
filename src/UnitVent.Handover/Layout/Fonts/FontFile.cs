using System.Collections.Concurrent;
using System.Text;
using PdfSharp.Drawing;

namespace UnitVent.Handover.Layout.Fonts;

/// <summary>One installed font file; its path is the name by which PDFsharp asks for it.</summary>
internal sealed class FontFile(string path)
{
    private readonly Lazy<IReadOnlySet<int>> coverage = new(() => GlyphCoverage.Read(path));
    private readonly ConcurrentDictionary<double, XFont> sizes = new();

    public string Name => Path.GetFileNameWithoutExtension(path);

    public bool Has(Rune character) => coverage.Value.Contains(character.Value);

    /// <summary>The font at a size, always with Unicode encoding, so that one subset a face is embedded.</summary>
    public XFont At(double points) =>
        sizes.GetOrAdd(points, size => new XFont(path, size, XFontStyleEx.Regular, XPdfFontOptions.UnicodeDefault));
}
