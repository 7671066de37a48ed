using NodaTime;

namespace UnitVent.Store.Model;

/// <summary>One link of a unit's audit chain. Number, previous hash and hash are made by the database.</summary>
internal sealed class AuditEventRow
{
    public Guid UnitId { get; set; }

    public long Number { get; set; }

    public Instant At { get; set; }

    public string Who { get; set; } = "";

    public string What { get; set; } = "";

    public Guid? Subject { get; set; }

    public string Detail { get; set; } = "";

    public byte[] PreviousHash { get; set; } = [];

    public byte[] Hash { get; set; } = [];
}
