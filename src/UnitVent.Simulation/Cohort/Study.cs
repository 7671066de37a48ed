using NodaTime;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Episodes;
using UnitVent.Charting.Flags;
using UnitVent.Charting.Rules;
using UnitVent.Charting.Windows;
using UnitVent.Physiology;
using UnitVent.Simulation.Randomness;

namespace UnitVent.Simulation.Cohort;

/// <summary>Simulated patients of three days, every second one with one planted deterioration: what the rules make of their charts.</summary>
/// <remarks>The same seed and number of patients give the same study.</remarks>
public static class Study
{
    private const double UncutDeviations = 8; // nobody repeats a reading because it lies far out

    public static readonly Instant Start = Instant.FromUtc(2026, 3, 2, 6, 0);
    private static readonly Duration Length = Duration.FromHours(CohortPatient.Hours);
    private static readonly BarometricPressure Barometric = BarometricPressure.FromAltitude(0);

    public static double PatientDays(IReadOnlyCollection<CohortCourse> courses) => courses.Count * Length.TotalDays;

    /// <summary>The courses of all patients, by number.</summary>
    /// <param name="seed">Chooses the patients, their noise and the times of the staff.</param>
    /// <param name="patients">How many.</param>
    public static IReadOnlyList<CohortCourse> Run(ulong seed, int patients)
    {
        var random = new KeyedRandom(seed) { LargestDeviation = UncutDeviations };
        var unit = new UnitProfile(SeededId.At(Start, random.For("unit")), "STUDY", "Cohort study", DateTimeZone.Utc);
        var courses = new CohortCourse[patients];
        Parallel.For(0, patients, number => courses[number] = Course(new CohortPatient(number, random, Barometric), unit));
        return courses;
    }

    private static CohortCourse Course(CohortPatient patient, UnitProfile unit)
    {
        var chart = StudyChart.Of(patient.Tell(Barometric, Start), unit);
        var (all, cautions) = (new CardCount(Severity.Advisory), new CardCount(Severity.Caution));
        foreach (var moment in Replay.Moments(chart, Start, Start + Length))
        {
            all.See(moment);
            cautions.See(moment);
        }

        var kind = patient.Planted is { } planted ? PlantedKind.Of(planted) : null;
        return new(
            patient.Number, kind, kind is null ? null : At(patient.PlantedHour),
            kind is null ? null : Onset.HourOf(patient, kind, Barometric) is { } hour ? At(hour) : null,
            all.Lives, cautions.Lives,
            FixedLimits.Cards(chart, BodySize.PredictedWeightKg(chart.Episode.Patient)!.Value),
            Gases(chart));
    }

    private static IReadOnlyList<(Instant, Instant)> Gases(ChartWindow chart) =>
        [.. chart.Of<BloodGas>(EntryKind.BloodGas, Start + Length).Select(g => (g.At, g.Entry.RecordedAt))];

    private static Instant At(double hour) => Start + Duration.FromMinutes((long)Math.Round(hour * 60));
}
