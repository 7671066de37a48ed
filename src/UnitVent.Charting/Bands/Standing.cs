using NodaTime;
using UnitVent.Charting.Flags;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Rules;
using UnitVent.Charting.Wording;

namespace UnitVent.Charting.Bands;

/// <summary>Where a patient stands on the board, and the sentence that says why.</summary>
/// <param name="Band">The band.</param>
/// <param name="Why">One sentence, numbers first, with its age.</param>
/// <param name="Since">Since when; null when nothing is raised.</param>
/// <param name="Cards">All open cards, the leading one first.</param>
public sealed record Standing(Band Band, string Why, Instant? Since, IReadOnlyList<Card> Cards)
{
    private const string Nothing = "Nothing raised.";
    private const string NotKnownRuleId = "R17";

    private static readonly Duration LateAfter = Duration.FromMinutes(30);
    private static readonly Duration LookWithin = Duration.FromHours(1);

    /// <summary>Gets the card that leads; null when none is open.</summary>
    public Card? Leading => Cards.Count > 0 ? Cards[0] : null;

    /// <summary>Gets by when somebody looks: an hour after a caution card was raised, or when it is no longer in hand; null outside <see cref="Band.LookThisHour"/>.</summary>
    public Instant? DueAt => Band == Band.LookThisHour
        ? Cards.Where(IsForThisHour).Min(c => c.InHand ? c.Leading.ComesBackAt!.Value : c.Flags.Min(f => f.Since) + LookWithin)
        : null;

    /// <summary>Where the patient stands, from the open flags and the picture.</summary>
    public static Standing Of(IReadOnlyList<Flag> open, PatientPicture picture)
    {
        ArgumentNullException.ThrowIfNull(picture);
        var cards = OpenCards.Of(open);
        var unknown = picture.Outcomes.OfType<RuleOutcome.Raised>().FirstOrDefault(o => o.Rule == NotKnownRuleId)?.Finding;
        var band = cards.Any(c => c.Severity == Severity.Urgent) ? Band.LookNow
            : cards.Any(IsForThisHour) ? Band.LookThisHour
            : unknown is not null ? Band.NotKnown
            : Band.NothingRaised;
        if (band == Band.NotKnown)
        {
            return new(band, Sentence(unknown!.Says, "", cards.Count(c => c.Family != Family.Due)), unknown.SeenAt, cards);
        }

        return cards.Count == 0
            ? new(band, Nothing, null, cards)
            : new(band, Sentence(Says(cards[0]), Age(cards[0].Leading.Finding, picture), cards.Count - 1), cards[0].Flags.Min(f => f.Since), cards);
    }

    private static bool IsForThisHour(Card card) => card.Severity == Severity.Caution || card.Flags.Any(f => f.Finding.Overdue);

    private static string Says(Card card) => string.Join("; ", card.Flags.Select(f => f.Finding.Says));

    private static string Sentence(string says, string age, int more) => says + age + (more > 0 ? $" · +{more} more" : "");

    private static string Age(Finding finding, PatientPicture picture)
    {
        if (finding.Family == Family.Due)
        {
            return "";
        }

        var behind = finding.Entries.Count > 0 ? picture.Window.Standing.FirstOrDefault(e => e.Id == finding.Entries[0]) : null;
        var late = behind is not null && behind.RecordedAt - behind.EffectiveAt > LateAfter ? " · late entry" : "";
        var rechecked = picture.AsOf - finding.SeenAt > picture.Limits.Gas ? ", not rechecked" : "";
        return $" · {Times.Clock(finding.SeenAt, picture)}{rechecked}{late}";
    }
}
