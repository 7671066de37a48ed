using UnitVent.Charting.Bands;

namespace UnitVent.Web.Board;

/// <summary>The rows of a board as somebody wants to see them: filtered, by band or in walking order.</summary>
/// <param name="All">Every row, in the order of the bands.</param>
/// <param name="Filter">Which are shown.</param>
/// <param name="WalkingOrder">Whether they stand in the order of the beds.</param>
/// <param name="Beds">The beds in walking order.</param>
public sealed record BoardView(IReadOnlyList<PatientRow> All, BoardFilter Filter, bool WalkingOrder, IReadOnlyList<string> Beds)
{
    /// <summary>The rows with their heading; one group without heading in walking order.</summary>
    public IReadOnlyList<(Band? Band, IReadOnlyList<PatientRow> Rows)> Groups
    {
        get
        {
            var shown = All.Where(Filter.Shows);
            return WalkingOrder
                ? [(null, [.. shown.OrderBy(r => Walk(r.Bed)).ThenBy(r => r.Bed, StringComparer.Ordinal)])]
                : [.. Enum.GetValues<Band>().Select(b => ((Band?)b, Rows: (IReadOnlyList<PatientRow>)[.. shown.Where(r => r.Band == b)])).Where(g => g.Rows.Count > 0)];
        }
    }

    public int Count(Band band) => All.Count(r => r.Band == band);

    public int DueWithinTheHour => All.Count(r => r.DueWithinTheHour);

    private int Walk(string bed) => Beds.ToList().IndexOf(bed) is >= 0 and var place ? place : int.MaxValue;
}
