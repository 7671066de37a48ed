using NodaTime;
using UnitVent.Charting.Rules;

namespace UnitVent.Simulation.Cohort;

/// <summary>How the study went for one patient.</summary>
/// <param name="Number">The patient.</param>
/// <param name="Planted">What was planted; null for a quiet patient.</param>
/// <param name="PlantedAt">When it began.</param>
/// <param name="MattersAt">When the truth passed the minimum important change; null for a quiet patient, or when it never did.</param>
/// <param name="AllCards">The cards, advisories included.</param>
/// <param name="Cautions">The cards from caution on.</param>
/// <param name="Baseline">The cards of the fixed limits.</param>
/// <param name="Gases">When the gases were drawn and recorded.</param>
public sealed record CohortCourse(
    int Number,
    PlantedKind? Planted,
    Instant? PlantedAt,
    Instant? MattersAt,
    IReadOnlyList<CardLife> AllCards,
    IReadOnlyList<CardLife> Cautions,
    IReadOnlyList<CardLife> Baseline,
    IReadOnlyList<(Instant Drawn, Instant Recorded)> Gases)
{
    /// <summary>The first caution or urgent card that says what was planted; null when none does.</summary>
    public Found? FoundByRules => FoundBy(Cautions);

    /// <summary>The first crossing of a fixed limit that says what was planted; null when none does.</summary>
    public Found? FoundByLimits => FoundBy(Baseline);

    /// <summary>A card counts that opens once the truth has passed the change, or that has opened since the planting and is then still open.</summary>
    private Found? FoundBy(IReadOnlyList<CardLife> cards)
    {
        if (MattersAt is not { } matters)
        {
            return null;
        }

        var card = cards.Where(c => Planted!.Fits.Contains(c.Family)).FirstOrDefault(c => c.OpenedAt >= matters || (c.OpenedAt >= PlantedAt && c.OpenAt(matters)));
        return card is null
            ? null
            : new(card.Rule, card.Family, Math.Max(0, (card.OpenedAt - matters).TotalHours), Gases.Count(g => g.Drawn >= matters && g.Recorded <= card.OpenedAt));
    }
}

/// <summary>What found a deterioration.</summary>
/// <param name="Rule">The rule that led, or the limit.</param>
/// <param name="Family">The family of its card.</param>
/// <param name="Hours">Hours since the truth passed the minimum important change; zero when it was found before.</param>
/// <param name="Gases">Gases drawn since then and recorded by then.</param>
public sealed record Found(string Rule, Family Family, double Hours, int Gases);
