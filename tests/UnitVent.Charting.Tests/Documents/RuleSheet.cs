using System.Globalization;
using System.Text;
using UnitVent.Charting.Rules;

namespace UnitVent.Charting.Tests.Documents;

/// <summary>docs/rules.md as it follows from the code.</summary>
internal static class RuleSheet
{
    private const string Head = """
        # Rules

        Generated from the code; do not edit. A test holds it current and `UNITVENT_WRITE_DOCS=1 dotnet test --project tests/UnitVent.Charting.Tests` writes it anew.

        A rule looks at the picture of one patient and states what it saw; it never tells anyone what to do. Findings of one family stand on one card, the
        strongest first. A value that is too old stops a rule from raising; it never clears what was raised. Taking a card in hand clears nothing either.
        Every number is a unit's to choose within its limits; thresholds that decide over an urgent level need two people. Local protocol and licensed
        practice decide.


        """;

    /// <summary>The figures of the study that docs/cohort-study.md tells in full, with how to repeat it.</summary>
    private const string Tried = """

        ## How they were tried

        210 invented patients of 3 days, half with one planted deterioration, seed 4 (`dotnet run -c Release --project tests/UnitVent.CohortStudy`): 105 of 105
        found, at the median after 2.6 h and one gas; on the quiet half 0.225 cards a patient-day, 0.108 from caution on. Plain fixed limits found 82 of 105 with
        0.822 cards a patient-day. Kinds, other seeds, what was changed because of it and what it cannot say: [cohort study](cohort-study.md).

        """;

    public static string Text()
    {
        var text = new StringBuilder(Head.ReplaceLineEndings("\n"));
        text.Append("## What each rule sees\n\n| id | family | seen | levels | quiet, and what shifts it |\n|---|---|---|---|---|\n");
        foreach (var rule in RuleSet.All.OrderBy(r => r.Id, StringComparer.Ordinal))
        {
            text.Append($"| {rule.Id} | {Words(rule.Family)} | {rule.Seen} | {rule.Levels} | {Quiet(rule)} |\n");
        }

        text.Append("\n## Thresholds\n\n| rule | threshold | default | limits | unit | two people | source |\n|---|---|---|---|---|---|---|\n");
        foreach (var t in Threshold.All)
        {
            text.Append($"| {t.Rule} | {t.Is.Label} | {Number(t.Default)} | {Number(t.Is.Low)}–{Number(t.Is.High)} | {(t.Is.Unit.Length == 0 ? "–" : t.Is.Unit)} | {(t.Is.Urgent ? "yes" : "")} | {t.Is.Source} |\n");
        }

        text.Append(Tried.ReplaceLineEndings("\n"));
        return text.ToString();
    }

    private static string Quiet(Rule rule) => string.Join(" ", new[]
    {
        rule.QuietOffUnit ? "Off the unit or the ventilator." : "",
        rule.QuietInComfortCare ? "Comfort care." : "",
        rule.QuietOnEcmo ? "ECMO." : "",
        rule.SaidOnce ? "Once seen, until the setting changes or 12 h pass." : "",
        rule.Remarks,
    }.Where(w => w.Length > 0)) is { Length: > 0 } words ? words : "–";

    private static string Words(Family family) => string.Concat(family.ToString().Select((c, i) => i > 0 && char.IsUpper(c) ? " " + char.ToLowerInvariant(c) : c.ToString())).ToLowerInvariant();

    private static string Number(double value) => value.ToString("0.###", CultureInfo.InvariantCulture);
}
