using System.Globalization;
using UnitVent.Charting.Rules;
using UnitVent.Simulation.Cohort;

namespace UnitVent.CohortStudy;

/// <summary>The results as tables in Markdown.</summary>
internal static class StudyReport
{
    public static IEnumerable<string> Of(IReadOnlyList<CohortCourse> courses) =>
        [.. Planted([.. courses.Where(c => c.Planted is not null)]), "", .. Quiet([.. courses.Where(c => c.Planted is null)]), "", .. Fits()];

    private static IEnumerable<string> Fits()
    {
        yield return "| planted | cards that count as having found it | because |";
        yield return "| --- | --- | --- |";
        foreach (var kind in PlantedKind.All)
        {
            yield return $"| {kind.What} | {string.Join(", ", kind.Fits)} | {kind.Because} |";
        }
    }

    private static IEnumerable<string> Planted(IReadOnlyList<CohortCourse> courses)
    {
        yield return "| planted | matters from | number | found | hours, median | gases, median | led by | fixed limits found | hours | led by |";
        yield return "| --- | --- | --- | --- | --- | --- | --- | --- | --- | --- |";
        foreach (var kind in PlantedKind.All)
        {
            yield return Row(kind.What, kind.Matters, [.. courses.Where(c => c.Planted == kind)]);
        }

        yield return Row("all", "", courses);
    }

    private static string Row(string what, string matters, IReadOnlyList<CohortCourse> courses)
    {
        var (rules, limits) = (courses.Select(c => c.FoundByRules).OfType<Found>().ToList(), courses.Select(c => c.FoundByLimits).OfType<Found>().ToList());
        return Invariant(
            $"| {what} | {matters} | {courses.Count} | {rules.Count} ({Share(rules.Count, courses.Count)}) | {Median(rules.Select(f => f.Hours))} | {Median(rules.Select(f => (double)f.Gases))} | {Led(rules)} | {limits.Count} ({Share(limits.Count, courses.Count)}) | {Median(limits.Select(f => f.Hours))} | {Led(limits)} |");
    }

    private static IEnumerable<string> Quiet(IReadOnlyList<CohortCourse> courses)
    {
        var days = Study.PatientDays(courses);
        yield return Invariant($"| cards a patient-day on {courses.Count} quiet patients, {days:0} days | all | caution or urgent | fixed limits |");
        yield return "| --- | --- | --- | --- |";
        var (all, cautions, baseline) = (Cards(courses, c => c.AllCards), Cards(courses, c => c.Cautions), Cards(courses, c => c.Baseline));
        yield return QuietRow("together", all.Count, cautions.Count, baseline.Count, days);
        foreach (var family in all.Concat(baseline).Select(c => c.Family).Distinct().Order())
        {
            yield return QuietRow($"{family}", Count(all, family), Count(cautions, family), Count(baseline, family), days);
        }

        foreach (var rule in all.Concat(cautions).Select(c => c.Rule).Distinct().Order())
        {
            yield return QuietRow($"led by {rule}", all.Count(c => c.Rule == rule), cautions.Count(c => c.Rule == rule), 0, days);
        }

        foreach (var limit in baseline.Select(c => c.Rule).Distinct().Order())
        {
            yield return QuietRow(limit, 0, 0, baseline.Count(c => c.Rule == limit), days);
        }
    }

    private static List<CardLife> Cards(IEnumerable<CohortCourse> courses, Func<CohortCourse, IReadOnlyList<CardLife>> which) => [.. courses.SelectMany(which)];

    private static int Count(IEnumerable<CardLife> cards, Family family) => cards.Count(c => c.Family == family);

    private static string QuietRow(string what, int all, int cautions, int baseline, double days) =>
        Invariant($"| {what} | {Rate(all, days)} | {Rate(cautions, days)} | {Rate(baseline, days)} |");

    private static string Rate(int cards, double days) => cards == 0 ? "–" : Invariant($"{cards / days:0.000}");

    private static string Led(IEnumerable<Found> found) =>
        string.Join(", ", found.CountBy(f => f.Rule).OrderByDescending(r => r.Value).Select(r => Invariant($"{r.Key} {r.Value}")));

    private static string Share(int part, int whole) => whole == 0 ? "–" : Invariant($"{100.0 * part / whole:0} %");

    private static string Median(IEnumerable<double> values)
    {
        var sorted = values.Order().ToList();
        return sorted.Count == 0 ? "–" : Invariant($"{(sorted[(sorted.Count - 1) / 2] + sorted[sorted.Count / 2]) / 2:0.#}");
    }

    private static string Invariant(FormattableString text) => text.ToString(CultureInfo.InvariantCulture);
}
