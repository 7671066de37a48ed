using NodaTime;
using UnitVent.Charting.Episodes;

namespace UnitVent.Store.Model;

/// <summary>The head of an episode: the row that every writer of its chart locks.</summary>
internal sealed class EpisodeRow
{
    public Guid UnitId { get; set; }

    public Guid Id { get; set; }

    public Guid PatientId { get; set; }

    public Instant AdmittedAt { get; set; }

    public Instant AirwaySecuredAt { get; set; }

    public string? Reason { get; set; }

    public Instant? EndedAt { get; set; }

    public Outcome? Outcome { get; set; }

    /// <summary>The first instant at which time alone changes anything.</summary>
    public Instant? NextEvaluationAt { get; set; }
}
