using NodaTime;

namespace UnitVent.Charting.Pictures;

/// <summary>An input of a computed value.</summary>
/// <param name="Name">Its name as the HTTP interface spells it.</param>
/// <param name="Value">Its value; null when it cannot be had.</param>
/// <param name="Unit">Its unit.</param>
/// <param name="At">When it was so; null for facts without a time.</param>
/// <param name="Entry">The entry it comes from; null when it comes from none.</param>
public sealed record Reading(string Name, double? Value, string Unit, Instant? At, Guid? Entry);
