using NodaTime;
using UnitVent.Charting.Bands;
using UnitVent.Charting.Episodes;
using UnitVent.Charting.Pictures;

namespace UnitVent.Handover;

/// <summary>What a unit's sheet is printed from.</summary>
/// <param name="Unit">The unit.</param>
/// <param name="Patients">Its ventilated patients in any order.</param>
/// <param name="PrintedAt">When it is printed.</param>
/// <param name="PrintedBy">By whom, by name.</param>
public sealed record UnitSheetInput(UnitProfile Unit, IReadOnlyList<UnitSheetPatient> Patients, Instant PrintedAt, string PrintedBy);

/// <summary>One line of a unit's sheet.</summary>
/// <param name="Now">The picture at the time of printing.</param>
/// <param name="Standing">Where the patient stands on the board.</param>
public sealed record UnitSheetPatient(PatientPicture Now, Standing Standing);
