namespace UnitVent.Handover.Layout.Blocks;

/// <summary>A row of a table.</summary>
internal sealed record Row(IReadOnlyList<Cell> Cells)
{
    public static Row Of(params Cell[] cells) => new(cells);
}

/// <summary>The text of one cell, with a mark before it where a word alone is too quiet.</summary>
internal sealed record Cell(string Text, bool IsStrong = false, Mark Mark = Mark.None)
{
    public static implicit operator Cell(string text) => new(text);
}

/// <summary>Shapes that can be told apart without colour.</summary>
internal enum Mark
{
    None,
    FilledSquare,
    HalfSquare,
    DashedSquare,
    OpenCircle,
}
