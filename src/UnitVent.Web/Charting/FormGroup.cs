namespace UnitVent.Web.Charting;

/// <summary>Fields that are read together.</summary>
/// <param name="Title">The heading; empty for none.</param>
/// <param name="Fields">The fields' names, in the order in which they are read.</param>
/// <param name="Folded">Whether the group is folded away until somebody opens it.</param>
public sealed record FormGroup(string Title, IReadOnlyList<string> Fields, bool Folded = false);
