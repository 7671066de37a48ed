using System.Text.Json.Nodes;
using NodaTime;

namespace UnitVent.Web.Charting;

/// <summary>The last value of a field, shown beside it and never put into it.</summary>
/// <param name="Shown">The value as it was typed.</param>
/// <param name="At">Since when it holds, or when it was read.</param>
/// <param name="Carried">Whether it is saved again, visibly, when nothing is typed: settings in force stay in force.</param>
/// <param name="Json">The value as it goes into the entry.</param>
public sealed record LastValue(string Shown, Instant At, bool Carried, JsonNode? Json);
