namespace UnitVent.Store;

/// <summary>Where something is charted.</summary>
/// <param name="UnitId">The unit.</param>
/// <param name="EpisodeId">The episode; empty for things of the unit.</param>
internal readonly record struct Place(Guid UnitId, Guid EpisodeId);
