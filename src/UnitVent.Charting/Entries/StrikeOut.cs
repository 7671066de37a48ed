using NodaTime;

namespace UnitVent.Charting.Entries;

/// <summary>How an entry was struck out.</summary>
/// <param name="At">When.</param>
/// <param name="By">By whom, by name.</param>
/// <param name="Reason">Why.</param>
public sealed record StrikeOut(Instant At, string By, string Reason);
