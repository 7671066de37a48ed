using PdfSharp.Drawing;
using PdfSharp.UniversalAccessibility;
using UnitVent.Handover.Layout.Text;

namespace UnitVent.Handover.Layout.Paging;

/// <summary>One page to draw on. Text belongs to the document's structure; rules and repeated heads are artifacts.</summary>
internal sealed class Canvas(XGraphics graphics, StructureBuilder structure)
{
    public const double Hairline = 0.5;
    public const double Faint = 0.2;

    /// <summary>Gets whether something on this page stands for a character that no installed font has.</summary>
    public bool HasMissing { get; private set; }

    public void Begin(PdfBlockLevelElementTag tag) => structure.BeginElement(tag);

    public void End() => structure.End();

    public void Tagged(PdfBlockLevelElementTag tag, Action draw)
    {
        structure.BeginElement(tag);
        draw();
        structure.End();
    }

    public void Figure(string alternativeText, XRect box, Action<XGraphics> draw)
    {
        structure.BeginElement(PdfIllustrationElementTag.Figure, alternativeText, box);
        draw(graphics);
        structure.End();
    }

    public void Artifact(Action<XGraphics> draw)
    {
        structure.BeginArtifact();
        draw(graphics);
        structure.End();
    }

    public void Rule(XPoint from, double width, double weight = Hairline) =>
        Artifact(lines => lines.DrawLine(new XPen(XColors.Black, weight), from.X, from.Y, from.X + width, from.Y));

    /// <summary>Draws a line of text with its top left corner at the point.</summary>
    public void Text(TextLine line, XPoint at)
    {
        var x = at.X;
        foreach (var run in line.Runs)
        {
            graphics.DrawString(run.Text, run.Font, XBrushes.Black, x, at.Y + line.Style.Baseline);
            x += run.Width;
        }

        HasMissing |= line.HasMissing;
    }

    /// <summary>Draws lines under each other, the first with its top left corner at the point.</summary>
    public void Lines(IReadOnlyList<TextLine> lines, XPoint at)
    {
        foreach (var line in lines)
        {
            Text(line, at);
            at += new XVector(0, line.Style.LineHeight);
        }
    }
}
