using UnitVent.Charting.Bands;
using UnitVent.Charting.Flags;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Windows;

namespace UnitVent.Store.Reading;

/// <summary>One patient as screens, sheets and the HTTP interface read it.</summary>
/// <param name="Window">The chart.</param>
/// <param name="Picture">What is computed from it.</param>
/// <param name="Flags">The open flags.</param>
/// <param name="Standing">Where the patient stands on the board.</param>
public sealed record PatientChart(ChartWindow Window, PatientPicture Picture, IReadOnlyList<Flag> Flags, Standing Standing);
