using NodaTime;
using UnitVent.Charting.Entries;
using UnitVent.Simulation.Lung;

namespace UnitVent.Simulation.Staff;

/// <summary>Everything that can be seen at a bed at one moment, and the instruments to read it with.</summary>
internal sealed record BedsideMoment(
    Instant At, PatientState State, PatientParameters Patient, SettingChange Settings, Bedside Bedside, Instruments Read);
