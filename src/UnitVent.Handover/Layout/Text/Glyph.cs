using PdfSharp.Drawing;

namespace UnitVent.Handover.Layout.Text;

/// <summary>One character, the font that draws it and how wide it is; <see cref="IsMissing"/> when no installed font has it.</summary>
internal readonly record struct Glyph(string Text, XFont Font, double Width, bool IsMissing)
{
    public bool IsSpace => Text == " ";

    public bool IsLineEnd => Text == "\n";
}
