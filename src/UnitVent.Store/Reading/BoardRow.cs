using UnitVent.Charting.Bands;
using UnitVent.Charting.Flags;
using UnitVent.Charting.Pictures;

namespace UnitVent.Store.Reading;

/// <summary>One ventilated patient on the board.</summary>
/// <param name="Picture">What is computed from the chart.</param>
/// <param name="Flags">The open flags.</param>
/// <param name="Standing">Where the patient stands.</param>
public sealed record BoardRow(PatientPicture Picture, IReadOnlyList<Flag> Flags, Standing Standing);
