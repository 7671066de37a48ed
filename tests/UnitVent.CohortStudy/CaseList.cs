using NodaTime;
using UnitVent.Simulation.Cohort;

namespace UnitVent.CohortStudy;

/// <summary>Every patient with every card, for finding out which rule makes noise or misses.</summary>
internal static class CaseList
{
    public static IEnumerable<string> Of(IReadOnlyList<CohortCourse> courses) => courses.Select(Case).Prepend("");

    private static string Case(CohortCourse course)
    {
        var what = course.Planted is not { } planted ? "quiet"
            : $"{planted.Kind} at {Hour(course.PlantedAt)}, matters at {Hour(course.MattersAt)}, {(course.FoundByRules is { } found ? $"found by {found.Rule}" : "MISSED")}";
        var cards = course.AllCards.Select(c => $"{c.Rule} {Hour(c.OpenedAt)}–{Hour(c.ClosedAt)}");
        var cautions = course.Cautions.Select(c => $"{c.Rule} {Hour(c.OpenedAt)}–{Hour(c.ClosedAt)}");
        return $"{course.Number}: {what}; cards {string.Join(", ", cards)}; from caution on {string.Join(", ", cautions)}";
    }

    private static string Hour(Instant? at) => at is { } known ? FormattableString.Invariant($"{(known - Study.Start).TotalHours:0.0}") : "…";
}
