namespace UnitVent.Handover.Layout.Paging;

/// <summary>What stands on every page of a section: whose it is above, what it is and how long it holds below.</summary>
/// <param name="Title">Large, on the left: the bed and the name.</param>
/// <param name="Detail">Under the title: what else tells one from another.</param>
/// <param name="Aside">On the right: what kind of sheet this is, line by line.</param>
/// <param name="Foot">Lines under the body; the page's number stands at the end of the last.</param>
internal sealed record PageFrame(string Title, string Detail, string Aside, IReadOnlyList<string> Foot);
