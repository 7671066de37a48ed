using NodaTime;

namespace UnitVent.Store.Model;

/// <summary>That an entry was struck out. Append-only; an entry is struck out once.</summary>
internal sealed class StrikeOutRow
{
    public Guid UnitId { get; set; }

    public Guid Id { get; set; }

    public Guid EntryId { get; set; }

    public Instant At { get; set; }

    public string By { get; set; } = "";

    public string Reason { get; set; } = "";
}
