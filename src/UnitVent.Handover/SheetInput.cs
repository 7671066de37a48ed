using NodaTime;
using UnitVent.Charting.Flags;
using UnitVent.Charting.Pictures;

namespace UnitVent.Handover;

/// <summary>What a patient's sheet is printed from. Unit, zone and whether it is a demonstration come from the picture's window.</summary>
/// <param name="Now">The picture at the time of printing.</param>
/// <param name="PrintedAt">When it is printed.</param>
/// <param name="PrintedBy">By whom, by name.</param>
public sealed record SheetInput(PatientPicture Now, Instant PrintedAt, string PrintedBy)
{
    /// <summary>Gets the picture of 24 hours before; null when the patient was not here.</summary>
    public PatientPicture? DayBefore { get; init; }

    /// <summary>Gets the open flags of the episode.</summary>
    public IReadOnlyList<Flag> OpenFlags { get; init; } = [];
}
