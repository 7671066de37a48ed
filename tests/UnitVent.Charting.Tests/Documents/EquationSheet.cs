using System.Text;
using UnitVent.Charting.Pictures;

namespace UnitVent.Charting.Tests.Documents;

/// <summary>docs/equations.md as it follows from the code.</summary>
internal static class EquationSheet
{
    private const string Head = """
        # Equations

        Generated from the code; do not edit. A test holds it current and `UNITVENT_WRITE_DOCS=1 dotnet test --project tests/UnitVent.Charting.Tests` writes it anew.

        Every number on screen, sheet and interface that was not read from a device or a slip is made by one of these. Values are computed unrounded and
        rounded only when shown. What is in square brackets is left out when it was not recorded; letters are defined after the semicolon. Gas tensions
        enter in mmHg (1 kPa = 760 ÷ 101.325 mmHg), airway pressures in cmH2O, FiO2 as a fraction. The version is raised whenever the same inputs give
        another number. Adults only. A number is an observation, never an order: local protocol and licensed practice decide.


        """;

    public static string Text()
    {
        var text = new StringBuilder(Head.ReplaceLineEndings("\n"));
        text.Append("## Behind the values of the picture\n\n| id | value | equation | unit | range and limits | source | version |\n|---|---|---|---|---|---|---|\n");
        foreach (var e in Equations.All.OrderBy(e => int.Parse(e.Id[1..])))
        {
            text.Append($"| {e.Id} | {ValueWords.Of(e.Result)!.Label} | {Cell(e.InWords)} | {Cell(e.Unit)} | {Cell(e.Limits)} | {e.Source} | {e.Version} |\n");
        }

        text.Append("\n## Projections, what is shown only when asked for, and the statistics of drift\n\n| id | what | equation | unit | range and limits | source | in code |\n|---|---|---|---|---|---|---|\n");
        foreach (var (e, code) in FurtherEquations.All)
        {
            text.Append($"| {e.Id} | {e.Result} | {Cell(e.Form)} | {Cell(e.Unit)} | {Cell(e.Limits)} | {e.Source} | `{code}` |\n");
        }

        return text.ToString();
    }

    private static string Cell(string text) => text.Length == 0 ? "–" : text.Replace("|", "\\|");
}
