using Microsoft.AspNetCore.Components;
using NodaTime;
using UnitVent.Charting.Bands;
using UnitVent.Store.Flags;
using UnitVent.Web.Charting;
using UnitVent.Web.Shared;

namespace UnitVent.Web.Board;

/// <summary>The open cards of a patient, each with its one-tap acknowledgement.</summary>
public sealed partial class CardList
{
    [Inject]
    private FlagDesk Desk { get; set; } = default!;

    [Inject]
    private CurrentActor Me { get; set; } = default!;

    private string Time(Instant at) => Format.Time(at, Now, Zone);

    /// <summary>Takes every flag of the card that nobody has in hand; all of them when it is taken over.</summary>
    private async Task TakeAsync(Card card, string? words, TypedTime? time, bool over = false)
    {
        if (time?.Problem is { } problem)
        {
            refused = problem;
            return;
        }

        busy = card.Family;
        refused = "";
        foreach (var flag in card.Flags.Where(f => over || f.InHand is null))
        {
            var taken = await Me.DoAsync(actor => Desk.AcknowledgeAsync(
                actor, flag.Id, Guid.CreateVersion7(), Written(words), time?.At, Written(told), Written(told) is null ? null : Now, CancellationToken.None, over));
            refused = taken.Succeeded ? refused : string.Join(" ", taken.Errors.Select(e => e.Message));
        }

        (busy, plan, until, told) = (null, "", "", "");
        await Taken.InvokeAsync();
    }

    private static string? Written(string? words) => string.IsNullOrWhiteSpace(words) ? null : words.Trim();
}
