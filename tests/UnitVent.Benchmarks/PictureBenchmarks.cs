using BenchmarkDotNet.Attributes;
using NodaTime;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Episodes;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Windows;

namespace UnitVent.Benchmarks;

/// <summary>One whole picture, values and rules, with drift and workings left lazy.</summary>
[MemoryDiagnoser]
[Config(typeof(InThisProcess))]
public class PictureBenchmarks
{
    private static readonly Instant Now = Instant.FromUtc(2026, 3, 10, 12, 0);

    private readonly ChartWindow day = Window(gases: 8, checks: 12, changes: 6, Duration.FromHours(24));
    private readonly ChartWindow month = Window(gases: 180, checks: 360, changes: 90, Duration.FromDays(30));

    /// <summary>A day of hand charting: 8 gases, 12 checks, 6 setting changes.</summary>
    [Benchmark(Baseline = true)]
    public int Day() => PatientPicture.At(day, Now).Outcomes.Count;

    /// <summary>Thirty days of it: 180 gases, 360 checks, 90 setting changes.</summary>
    [Benchmark]
    public int Month() => PatientPicture.At(month, Now).Outcomes.Count;

    /// <summary>The same day with every working written out.</summary>
    [Benchmark]
    public int DayWithWorkings() => PatientPicture.At(day, Now).Values.Values.Sum(v => v.Working?.Length ?? 0);

    /// <summary>The same day with the verdicts on all quantities whose drift is looked for.</summary>
    [Benchmark]
    public int DayWithDrifts() => PatientPicture.At(day, Now).Drifts.All.Count;

    private static ChartWindow Window(int gases, int checks, int changes, Duration span)
    {
        var patient = new PatientFacts { Mrn = "1", FamilyName = "Granit", Sex = Sex.Male, HeightCm = 175, BirthDate = new LocalDate(1960, 1, 1) };
        var unit = new UnitProfile(Guid.CreateVersion7(), "BENCH", "Invented unit", DateTimeZone.Utc);
        var bodies = Spread(changes, span).Select((at, i) => (at, (Entry)Settings(at, i)))
            .Concat(Spread(gases, span).Select((at, i) => (at + Duration.FromMinutes(90), (Entry)Gas(at + Duration.FromMinutes(90), i))))
            .Concat(Spread(checks, span).Select((at, i) => (at + Duration.FromMinutes(70), (Entry)Check(at + Duration.FromMinutes(70), i))));
        return new(
            new EpisodeFacts(Guid.Empty, unit.Id, "1", patient, Now - span, Now - span),
            unit,
            bodies.Select((b, i) => new ChartEntry(Guid.CreateVersion7(), Guid.Empty, b.Item1, b.Item1, "Invented", i, b.Item2)));
    }

    private static IEnumerable<Instant> Spread(int count, Duration span) => Enumerable.Range(0, count).Select(i => Now - span + (span * i / count));

    private static SettingChange Settings(Instant at, int i) => new()
    {
        ChangedAt = at,
        Mode = VentilationMode.Aprv,
        PHighCmH2O = 28 - (i % 3),
        PLowCmH2O = 0,
        THighS = 4.5m,
        TLowS = 0.5m,
        FiO2 = 0.5m,
    };

    private static BloodGas Gas(Instant at, int i) => new()
    {
        DrawnAt = at,
        Specimen = Specimen.Arterial,
        TensionUnit = TensionUnit.MmHg,
        PH = 7.34m,
        PCO2 = 46 + (i % 5),
        PO2 = 75 + (i % 7),
        BicarbonateMmolL = 25.1m,
        HaemoglobinGDl = 10,
        SO2Percent = 94,
    };

    private static VentilatorCheck Check(Instant at, int i) => new()
    {
        ObservedAt = at,
        SettingsConfirmed = true,
        TotalMinuteVolumeLMin = 8,
        ReleaseVolumeMl = 400 + (i % 9),
        ReleasesAveraged = 3,
        FlowReadings = 3,
        PeakExpiratoryFlowLMin = 60,
        EndReleaseFlowLMin = 36,
        SpO2Percent = 94,
        MeanArterialPressureMmHg = 74,
        MeanAirwayPressureCmH2O = 25,
    };
}
