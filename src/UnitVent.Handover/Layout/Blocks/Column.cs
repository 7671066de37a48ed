namespace UnitVent.Handover.Layout.Blocks;

/// <summary>A column: as wide as its widest text when <paramref name="Share"/> is 0, else that share of what the others leave.</summary>
internal sealed record Column(string Head, Align Align = Align.Left, double Share = 0);

/// <summary>Where text stands in its column.</summary>
internal enum Align
{
    Left,
    Right,
}
