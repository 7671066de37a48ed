using NodaTime;

namespace UnitVent.Charting.Flags;

/// <summary>Somebody has a flag in hand. It clears nothing and calms nothing.</summary>
/// <param name="At">Since when.</param>
/// <param name="By">Who, by name.</param>
/// <param name="Plan">What is planned, in words; null for a bare "seen, acting".</param>
/// <param name="Until">Until when it is in hand; after that the flag is open again.</param>
/// <param name="ToldWho">Who was told.</param>
/// <param name="ToldAt">When.</param>
public sealed record Acknowledgement(Instant At, string By, string? Plan, Instant Until, string? ToldWho, Instant? ToldAt);
