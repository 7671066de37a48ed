using UnitVent.Charting.Entries;
using UnitVent.Charting.Flags;
using UnitVent.Charting.Pictures;

namespace UnitVent.Store.Recording;

/// <summary>What recording answered with: what stands now, and what it changed.</summary>
/// <param name="Entries">The entries as they stand in the chart.</param>
/// <param name="AlreadyStood">Whether all of them had been recorded before: nothing was written.</param>
/// <param name="Before">The picture before.</param>
/// <param name="After">The picture with them.</param>
/// <param name="Steps">What happened to flags.</param>
public sealed record RecordReceipt(
    IReadOnlyList<ChartEntry> Entries, bool AlreadyStood, PatientPicture Before, PatientPicture After, IReadOnlyList<FlagStep> Steps);
