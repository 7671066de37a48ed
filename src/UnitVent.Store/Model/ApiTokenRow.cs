using NodaTime;
using UnitVent.Store.People;

namespace UnitVent.Store.Model;

internal sealed class ApiTokenRow
{
    public Guid Id { get; set; }

    public Guid UnitId { get; set; }

    public UnitRole Role { get; set; }

    public string Name { get; set; } = "";

    public byte[] Hash { get; set; } = [];

    public Instant CreatedAt { get; set; }

    public Instant ExpiresAt { get; set; }

    public Instant? RevokedAt { get; set; }

    public Instant? LastUsedAt { get; set; }
}
