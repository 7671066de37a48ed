using NodaTime;
using UnitVent.Charting.Entries;

namespace UnitVent.Simulation;

/// <summary>What one person recorded at once: one transaction.</summary>
/// <param name="At">When it was so at the bedside.</param>
/// <param name="RecordedAt">When it was typed.</param>
/// <param name="By">Who typed it; an invented name that says the role.</param>
/// <param name="Role">The role of that person.</param>
/// <param name="Entries">What was typed.</param>
public sealed record SimulatedAction(Instant At, Instant RecordedAt, string By, UnitRoleName Role, IReadOnlyList<NewEntry> Entries);
