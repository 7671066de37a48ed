using NodaTime;
using UnitVent.Handover.Layout.Blocks;

namespace UnitVent.Handover.Layout.Paging;

/// <summary>A document to print: sections that each begin on a page of their own.</summary>
internal sealed record SheetDocument(string Title, Paper Paper, Instant PrintedAt, IReadOnlyList<SheetSection> Sections)
{
    /// <summary>Gets the words printed across every page, if any.</summary>
    public string? Watermark { get; init; }
}

/// <summary>A part with its own frame and its own page numbers, such as one patient.</summary>
internal sealed record SheetSection(string Bookmark, PageFrame Frame, IReadOnlyList<Block> Blocks);
