using NodaTime;

namespace UnitVent.Store.Model;

/// <summary>Admit, move, end, reopen, cancel. Append-only.</summary>
internal sealed class EpisodeEventRow
{
    public Guid UnitId { get; set; }

    public Guid Id { get; set; }

    public Guid EpisodeId { get; set; }

    public string Kind { get; set; } = "";

    public Instant At { get; set; }

    public Instant RecordedAt { get; set; }

    public string RecordedBy { get; set; } = "";

    /// <summary>What was asked for, whole: the bed, the outcome, the reason, the facts, whichever the kind has.</summary>
    public string? Detail { get; set; }
}
