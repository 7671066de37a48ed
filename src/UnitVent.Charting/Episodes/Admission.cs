using NodaTime;
using UnitVent.Charting.Entries;

namespace UnitVent.Charting.Episodes;

/// <summary>What is needed to admit a patient to a bed.</summary>
/// <param name="Id">The episode's id, made by whoever admits.</param>
/// <param name="Bed">The bed's name.</param>
/// <param name="Patient">Who the patient is.</param>
/// <param name="AirwaySecuredAt">When the airway was secured.</param>
public sealed record Admission(Guid Id, string Bed, PatientFacts Patient, Instant AirwaySecuredAt)
{
    /// <summary>Gets why the patient is ventilated.</summary>
    public string? Reason { get; init; }

    /// <summary>Gets the circumstances in force from the start.</summary>
    public IReadOnlyList<Circumstance> ContextFlags { get; init; } = [];

    /// <summary>Gets the method for this patient; null for the unit's.</summary>
    public SettingMethod? Method { get; init; }

    /// <summary>Gets the phase; null for starting.</summary>
    public CoursePhase? Phase { get; init; }

    /// <summary>Gets the codes of the questions that were answered with yes.</summary>
    public IReadOnlyList<string> Confirmed { get; init; } = [];
}
