using NodaTime;

namespace UnitVent.Charting.Episodes;

/// <summary>One stay of one patient on a ventilator in one unit.</summary>
/// <param name="Id">The episode's id.</param>
/// <param name="UnitId">The unit.</param>
/// <param name="Bed">The bed's name; the last one when the episode has ended.</param>
/// <param name="Patient">Who the patient is.</param>
/// <param name="AirwaySecuredAt">When the airway was secured: ventilator days count from here.</param>
/// <param name="AdmittedAt">When the episode began in this unit.</param>
public sealed record EpisodeFacts(
    Guid Id, Guid UnitId, string Bed, PatientFacts Patient, Instant AirwaySecuredAt, Instant AdmittedAt)
{
    /// <summary>Gets why the patient is ventilated, in words.</summary>
    public string? Reason { get; init; }

    /// <summary>Gets when it ended; null while it lasts.</summary>
    public Instant? EndedAt { get; init; }

    /// <summary>Gets how it ended.</summary>
    public Outcome? Outcome { get; init; }
}
