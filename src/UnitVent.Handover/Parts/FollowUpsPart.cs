using UnitVent.Charting.Entries;
using UnitVent.Handover.Layout.Blocks;

namespace UnitVent.Handover.Parts;

/// <summary>What is still to be done: what, for whom, by when; and the notes of the last twelve hours.</summary>
internal static class FollowUpsPart
{
    private static readonly NodaTime.Duration NotesBack = NodaTime.Duration.FromHours(12);

    public static IEnumerable<Block> Of(SheetPart part) => part.Now.FollowUps.Count == 0
        ? [new Heading("Follow-ups"), new Paragraph("None open.")]
        : [new Heading("Follow-ups"), new Table(
            [new("Due"), new("For"), new("What", Share: 1)],
            [.. part.Now.FollowUps.Select(followUp => Row.Of(Due(part, followUp), followUp.Body.ForRole ?? "anyone", followUp.Body.What ?? ""))])];

    /// <summary>Notes written at the bedside, in their authors' words.</summary>
    public static IEnumerable<Block> Notes(SheetPart part)
    {
        var notes = part.Now.Window.Of<Note>(EntryKind.Note, part.Now.AsOf).Where(note => note.At >= part.Now.AsOf - NotesBack).Reverse().ToList();
        return notes.Count == 0
            ? [new Heading("What to watch", "notes of the last 12 h"), new Paragraph("No note written.")]
            : [new Heading("What to watch", "notes of the last 12 h, newest first, in their authors' words"),
                .. notes.Select(note => new Paragraph($"{part.Source(note)}: {note.Body.Text}"))];
    }

    private static Cell Due(SheetPart part, Charted<FollowUp> followUp)
    {
        var due = followUp.Body.DueAt!.Value;
        return due < part.Now.AsOf ? new Cell($"{part.Times.At(due)}, overdue", IsStrong: true) : part.Times.At(due);
    }
}
