using PdfSharp.Drawing;

namespace UnitVent.Handover.Layout.Paging;

/// <summary>What is never split: one line, one table row, one figure. Drawn with its top left corner at the point given.</summary>
internal sealed record Piece(double Height, Action<Canvas, XPoint> Draw)
{
    /// <summary>Gets whether a page may not end after this piece.</summary>
    public bool KeepWithNext { get; init; }

    /// <summary>Gets whether this is white space, which is dropped at the top of a page.</summary>
    public bool IsSpace { get; init; }

    /// <summary>Gets whether this is left out, with what it is kept with, where it would begin another page.</summary>
    public bool IsDispensable { get; init; }

    /// <summary>Gets the head that is drawn again when a page begins with this piece.</summary>
    public Piece? RepeatedHead { get; init; }

    /// <summary>Gets the names under which a reader's list of contents finds this piece.</summary>
    public IReadOnlyList<string> Bookmarks { get; init; } = [];

    public static Piece Space(double height) => new(height, (_, _) => { }) { IsSpace = true };
}

/// <summary>A piece and its distance from the top of the page's body.</summary>
internal readonly record struct PlacedPiece(Piece Piece, double Top);
