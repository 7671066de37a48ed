using UnitVent.Charting.Flags;
using UnitVent.Charting.Rules;

namespace UnitVent.Charting.Bands;

/// <summary>Puts open flags on cards: one a family, save that what explains one another stands together.</summary>
internal static class OpenCards
{
    private static readonly Family[] ExplainedBySuddenChange =
        [Family.Timing, Family.Airway, Family.Collapse, Family.Drive, Family.Effort, Family.CarbonDioxide, Family.Oxygen, Family.VolumeAndPressure, Family.Circulation];

    private static readonly string[] OnlyWithoutCaution = ["R37", "R38"];

    /// <summary>The cards, the leading one first. Left out are what rests on a setting and was heard, what is for the due list only, and what matches criteria while a caution is open.</summary>
    public static List<Card> Of(IReadOnlyList<Flag> open)
    {
        var alarming = open.Any(f => f.Finding.Severity >= Severity.Caution);
        var said = open.Where(f => !f.IsHeard && !IsDueListOnly(f.Finding) && !(alarming && OnlyWithoutCaution.Contains(f.Finding.Rule))).ToList();
        return [.. said
            .GroupBy(f => FamilyOf(f.Finding, said))
            .Select(g => new Card(g.Key, [.. g.OrderByDescending(f => f.Finding.Severity).ThenByDescending(f => f.Finding.SeenAt)]))
            .OrderByDescending(c => c.Severity)
            .ThenBy(c => c.InHand)
            .ThenByDescending(c => c.Leading.Finding.SeenAt)];
    }

    /// <summary>A sudden change takes in what the same check shows; a long release explains a collapse, a short one a narrow airway, a fallen minute volume rising carbon dioxide.</summary>
    private static Family FamilyOf(Finding finding, List<Flag> open) =>
        ExplainedBySuddenChange.Contains(finding.Family) && open.Any(f => f.Finding.Family == Family.Sudden && OnSameEntry(f.Finding, finding)) ? Family.Sudden
        : (finding.Rule, finding.Family) switch
        {
            ("R02", _) when Open(open, Family.Airway) => Family.Airway,
            ("R53", _) when Open(open, Family.CarbonDioxide) => Family.CarbonDioxide,
            ("R01", _) when Open(open, Family.Collapse) => Family.Collapse,
            var (_, own) => own,
        };

    private static bool IsDueListOnly(Finding finding) => finding is { Family: Family.Due, Severity: Severity.Information };

    private static bool Open(List<Flag> open, Family family) => open.Any(f => f.Finding.Family == family);

    private static bool OnSameEntry(Finding one, Finding other) => one.Entries.Count > 0 && other.Entries.Count > 0 && one.Entries[0] == other.Entries[0];
}
