using NodaTime;

namespace UnitVent.Store.People;

/// <summary>A token of the HTTP interface, without its secret.</summary>
/// <param name="Id">Its id.</param>
/// <param name="UnitCode">Its unit.</param>
/// <param name="Role">What it is in the unit.</param>
/// <param name="Name">What it is for.</param>
/// <param name="CreatedAt">When it was made.</param>
/// <param name="ExpiresAt">When it ends.</param>
/// <param name="RevokedAt">When it was revoked; null while it was not.</param>
/// <param name="LastUsedAt">When it was last used, to about five minutes; null when never.</param>
public sealed record ApiToken(Guid Id, string UnitCode, UnitRole Role, string Name, Instant CreatedAt, Instant ExpiresAt, Instant? RevokedAt, Instant? LastUsedAt);
