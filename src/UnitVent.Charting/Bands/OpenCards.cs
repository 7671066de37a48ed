using UnitVent.Charting.Flags;
using UnitVent.Charting.Rules;

namespace UnitVent.Charting.Bands;

/// <summary>Puts open flags on cards: one a family, save that what explains one another stands together.</summary>
internal static class OpenCards
{
    private static readonly Family[] ExplainedBySuddenChange =
        [Family.Timing, Family.Airway, Family.Collapse, Family.Drive, Family.Effort, Family.CarbonDioxide, Family.Oxygen, Family.VolumeAndPressure, Family.Circulation];

    /// <summary>The cards, the leading one first. Left out are what rests on a setting and was heard, what is for the due list only, and what matches criteria while a caution is open.</summary>
    public static List<Card> Of(IReadOnlyList<Flag> open)
    {
        var alarming = open.Any(f => f.Finding.Severity >= Severity.Caution);
        var said = open.Where(f => !f.IsHeard && !IsDueListOnly(f.Finding) && !(alarming && RuleSet.Find(f.Finding.Rule) is { OnlyWithoutCaution: true })).ToList();
        return [.. said
            .GroupBy(f => FamilyOf(f.Finding, said))
            .Select(g => new Card(g.Key, [.. g.OrderByDescending(f => f.Finding.Severity).ThenByDescending(f => f.Finding.SeenAt)]))
            .OrderByDescending(c => c.Severity)
            .ThenBy(c => c.InHand)
            .ThenByDescending(c => c.Leading.Finding.SeenAt)];
    }

    /// <summary>A sudden change takes in what the same check shows; else a finding joins the card of what it explains.</summary>
    private static Family FamilyOf(Finding finding, List<Flag> open) =>
        ExplainedBySuddenChange.Contains(finding.Family) && open.Any(f => f.Finding.Family == Family.Sudden && OnSameEntry(f.Finding, finding)) ? Family.Sudden
        : RuleSet.Find(finding.Rule)?.Joins is { } explained && open.Any(f => f.Finding.Family == explained) ? explained
        : finding.Family;

    private static bool IsDueListOnly(Finding finding) => finding is { Family: Family.Due, Severity: Severity.Information };

    private static bool OnSameEntry(Finding one, Finding other) => one.Entries.Count > 0 && other.Entries.Count > 0 && one.Entries[0] == other.Entries[0];
}
