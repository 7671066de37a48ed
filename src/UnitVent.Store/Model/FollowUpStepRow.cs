using NodaTime;
using UnitVent.Charting.Entries;

namespace UnitVent.Store.Model;

/// <summary>What became of a follow-up. Append-only.</summary>
internal sealed class FollowUpStepRow
{
    public Guid UnitId { get; set; }

    public Guid Id { get; set; }

    public Guid FollowUpId { get; set; }

    public FollowUpStep Step { get; set; }

    public Instant At { get; set; }

    public string By { get; set; } = "";

    public string? Reason { get; set; }

    public string? ForRole { get; set; }
}
