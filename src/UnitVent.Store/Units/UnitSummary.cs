using NodaTime;
using UnitVent.Charting.Episodes;

namespace UnitVent.Store.Units;

/// <summary>A unit as administrators see it.</summary>
/// <param name="Profile">The unit.</param>
/// <param name="CreatedAt">When it was made.</param>
/// <param name="TakenBeds">The beds that are taken.</param>
public sealed record UnitSummary(UnitProfile Profile, Instant CreatedAt, IReadOnlyList<string> TakenBeds);
