using NodaTime;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Episodes;
using UnitVent.Simulation.Randomness;

namespace UnitVent.Simulation.Demo;

/// <summary>Who the invented patient is and why they are ventilated.</summary>
internal sealed record ScenarioPatient
{
    public required string Mrn { get; init; }

    public required string FamilyName { get; init; }

    public required string GivenName { get; init; }

    public required Sex Sex { get; init; }

    public required decimal HeightCm { get; init; }

    public bool HeightEstimated { get; init; }

    public required int AgeYears { get; init; }

    public required string Reason { get; init; }

    /// <summary>How long before the start the airway was secured.</summary>
    public required double AirwaySecuredHoursBefore { get; init; }

    public IReadOnlyList<Circumstance> Context { get; init; } = [];

    public SettingMethod? Method { get; init; }

    public required CoursePhase Phase { get; init; }

    public Admission AdmittedAt(Instant start, string bed, KeyedRandom random) => new(
        SeededId.At(start, random.For("admission")), bed, FactsOn(start.InUtc().Date), start - Duration.FromHours(AirwaySecuredHoursBefore))
    {
        Reason = Reason,
        ContextFlags = Context,
        Method = Method,
        Phase = Phase,
    };

    private PatientFacts FactsOn(LocalDate start) => new()
    {
        Mrn = Mrn,
        FamilyName = FamilyName,
        GivenName = GivenName,
        BirthDate = start.PlusYears(-AgeYears).PlusDays(-AgeYears), // some day that is not the start
        Sex = Sex,
        HeightCm = HeightCm,
        HeightEstimated = HeightEstimated,
    };
}
