namespace UnitVent.Store.Episodes;

/// <summary>What admitting answered with.</summary>
/// <param name="EpisodeId">The episode.</param>
/// <param name="AlreadyStood">Whether it had been admitted before with the same id: nothing was written.</param>
public sealed record AdmitReceipt(Guid EpisodeId, bool AlreadyStood);
