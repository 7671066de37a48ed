using UnitVent.Charting.Entries;

namespace UnitVent.Web.Charting;

/// <summary>What somebody opened the drawer for: one kind of entry, or the round of one ventilator with several in one save.</summary>
/// <param name="Title">The heading.</param>
/// <param name="Kinds">The kinds, in the order in which they are filled in.</param>
public sealed record ChartingTask(string Title, IReadOnlyList<EntryKind> Kinds)
{
    public static ChartingTask Pass { get; } =
        new("Pass", [EntryKind.VentilatorCheck, EntryKind.SettingChange, EntryKind.BreathingCheck, EntryKind.AirwayCheck]);

    /// <summary>The tasks in the order in which they stand in a menu.</summary>
    public static IReadOnlyList<ChartingTask> All { get; } =
    [
        Of(EntryKind.BloodGas),
        Of(EntryKind.SettingChange),
        Of(EntryKind.VentilatorCheck),
        Pass,
        Of(EntryKind.BreathingCheck),
        Of(EntryKind.AirwayCheck),
        Of(EntryKind.Event),
        Of(EntryKind.Note),
        Of(EntryKind.FollowUp),
        Of(EntryKind.Context),
        Of(EntryKind.Target),
        Of(EntryKind.Phase),
        Of(EntryKind.Method),
    ];

    /// <summary>The tasks of every hour.</summary>
    public static IReadOnlyList<ChartingTask> Frequent { get; } = [.. All.Take(4)];

    public bool IsPass => Kinds.Count > 1;

    public static ChartingTask Of(EntryKind kind) => new(Words.Of(kind), [kind]);
}
