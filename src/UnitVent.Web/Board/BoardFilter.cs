namespace UnitVent.Web.Board;

/// <summary>Which patients a board shows, as its address keeps it.</summary>
/// <param name="Name">The value of <c>show</c> in the address; empty for all.</param>
/// <param name="Label">The words on the screen.</param>
/// <param name="Shows">Whether a row is shown.</param>
public sealed record BoardFilter(string Name, string Label, Func<PatientRow, bool> Shows)
{
    public static IReadOnlyList<BoardFilter> All { get; } =
    [
        new("", "All", _ => true),
        new("attention", "Attention", r => r.Band != UnitVent.Charting.Bands.Band.NothingRaised),
        new("gas-due", "Gas due", r => r.GasDue),
        new("aprv", "On APRV", r => r.OnAprv),
        new("weaning", "Weaning", r => r.Weaning),
    ];

    public static BoardFilter Named(string? name) => All.FirstOrDefault(f => f.Name == name) ?? All[0];
}
