using UnitVent.Charting.Bands;
using UnitVent.Charting.Flags;
using UnitVent.Charting.Rules;

namespace UnitVent.Simulation.Cohort;

/// <summary>Follows the cards of one patient from a severity on: a card opens when a family that has none gets a flag.</summary>
internal sealed class CardCount(Severity least)
{
    private readonly List<CardLife> lives = [];
    private readonly Dictionary<Family, int> open = [];
    private HashSet<Guid> flagsBefore = [];

    public IReadOnlyList<CardLife> Lives => lives;

    public void See(ReplayedMoment moment)
    {
        var flags = moment.Open.Where(f => f.Finding.Severity >= least).ToList();
        var cards = Standing.Of(flags, moment.Picture).Cards;
        var at = moment.Picture.AsOf;
        foreach (var family in open.Keys.Except(cards.Select(c => c.Family)).ToList())
        {
            lives[open[family]] = lives[open[family]] with { ClosedAt = at };
            open.Remove(family);
        }

        foreach (var card in cards.Where(c => !open.ContainsKey(c.Family)))
        {
            // A card that comes apart into two shows nothing new.
            if (card.Flags.FirstOrDefault(f => !flagsBefore.Contains(f.Id)) is { } leading)
            {
                open[card.Family] = lives.Count;
                lives.Add(new(card.Family, leading.Finding.Rule, at, null));
            }
        }

        flagsBefore = [.. flags.Select(f => f.Id)];
    }
}
