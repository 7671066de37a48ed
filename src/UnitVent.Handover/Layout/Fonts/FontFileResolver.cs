using PdfSharp.Fonts;

namespace UnitVent.Handover.Layout.Fonts;

/// <summary>Answers PDFsharp with the file that is meant: the family name is the path.</summary>
internal sealed class FontFileResolver : IFontResolver
{
    public FontResolverInfo? ResolveTypeface(string familyName, bool isBold, bool isItalic) =>
        File.Exists(familyName) ? new FontResolverInfo(familyName) : null;

    public byte[]? GetFont(string faceName) => File.ReadAllBytes(faceName);
}
