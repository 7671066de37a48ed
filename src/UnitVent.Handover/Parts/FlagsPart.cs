using UnitVent.Charting.Bands;
using UnitVent.Handover.Layout.Blocks;
using UnitVent.Handover.Wording;

namespace UnitVent.Handover.Parts;

/// <summary>What is open, card by card: what was seen, for how long, who has it in hand with which plan.</summary>
internal static class FlagsPart
{
    public static IEnumerable<Block> Of(SheetPart part)
    {
        var standing = Standing.Of(part.Input.OpenFlags, part.Now);
        var heading = new Heading("Open cards", $"{Words.Of(standing.Band)} · as of {part.Times.At(part.Now.AsOf)}");
        return standing.Cards.Count == 0
            ? [heading, new Paragraph(standing.Why)]
            : [heading, new Table(
                [new("Asks for"), new("Seen", Share: 1.4), new("Open for"), new("In hand", Share: 1)],
                [.. standing.Cards.Select(card => Line(part, card))])];
    }

    private static Row Line(SheetPart part, Card card) => Row.Of(
        new Cell(Words.Of(card.Severity), Mark: Marks.Of(card.Severity)),
        string.Join('\n', card.Flags.Select(flag => $"{flag.Finding.Says} · {part.Times.At(flag.Finding.SeenAt)}")),
        part.Times.Since(card.Flags.Min(flag => flag.Since)),
        InHand(part, card));

    private static string InHand(SheetPart part, Card card) => card.Leading.InHand is { } hand
        ? $"{hand.By}: {hand.Plan ?? "seen, no plan written"}, until {part.Times.At(hand.Until)}"
        : "nobody yet";
}
