using NodaTime;
using UnitVent.Charting.Episodes;

namespace UnitVent.Simulation;

/// <summary>One invented patient and what was charted about them.</summary>
/// <param name="Admission">What the patient was admitted with.</param>
/// <param name="AdmittedAt">When.</param>
/// <param name="Actions">What the staff recorded, in the order of recording.</param>
public sealed record SimulatedEpisode(Admission Admission, Instant AdmittedAt, IReadOnlyList<SimulatedAction> Actions);
