using NodaTime;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Episodes;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Windows;

namespace UnitVent.Charting.Tests;

/// <summary>A chart written by a test: entries at minutes before now. Fixed synthetic data.</summary>
internal sealed class Chart
{
    public static readonly Instant Now = Instant.FromUtc(2026, 3, 10, 12, 0);

    private readonly List<ChartEntry> entries = [];
    private long sequence;

    public UnitProfile Unit { get; set; } = new(Guid.Parse("00000000-0000-7000-8000-000000000001"), "TEST", "Test unit", DateTimeZone.Utc);

    public PatientFacts Patient { get; set; } = new() { Mrn = "1", FamilyName = "Granit", Sex = Sex.Male, HeightCm = 175, BirthDate = new LocalDate(1960, 1, 1) };

    public Instant AdmittedAt { get; set; } = Now - Duration.FromDays(3);

    public static Instant Ago(double minutes) => Now - Duration.FromMinutes(minutes);

    public static SettingChange Aprv(double minutesAgo = 600, decimal high = 28, decimal low = 5, decimal tHigh = 4.5m, decimal tLow = 0.5m, decimal fiO2 = 0.5m) => new()
    {
        ChangedAt = Ago(minutesAgo),
        Mode = VentilationMode.Aprv,
        PHighCmH2O = high,
        PLowCmH2O = low,
        THighS = tHigh,
        TLowS = tLow,
        FiO2 = fiO2,
    };

    public static SettingChange PressureControl(double minutesAgo = 600) => new()
    {
        ChangedAt = Ago(minutesAgo),
        Mode = VentilationMode.PressureControl,
        SetRatePerMin = 20,
        InspiratoryPressureAbovePeepCmH2O = 20,
        InspiratoryTimeS = 1.0m,
        PeepCmH2O = 10,
        FiO2 = 0.5m,
    };

    public static BloodGas Gas(double minutesAgo = 30, decimal pO2 = 75, decimal? fiO2 = 0.5m, decimal pH = 7.34m, decimal pCO2 = 48, decimal? bicarbonate = 25.5m) => new()
    {
        DrawnAt = Ago(minutesAgo),
        Specimen = Specimen.Arterial,
        TensionUnit = TensionUnit.MmHg,
        PH = pH,
        PCO2 = pCO2,
        PO2 = pO2,
        FiO2 = fiO2,
        BicarbonateMmolL = bicarbonate,
    };

    public static VentilatorCheck Check(double minutesAgo = 25, decimal? peak = 60, decimal? end = 36, decimal? release = 380, decimal? spO2 = 94, decimal? map = 74) => new()
    {
        ObservedAt = Ago(minutesAgo),
        SettingsConfirmed = true,
        TotalMinuteVolumeLMin = 6.6m,
        ReleaseVolumeMl = release,
        ReleasesAveraged = 3,
        FlowReadings = 3,
        PeakExpiratoryFlowLMin = peak,
        EndReleaseFlowLMin = end,
        SpO2Percent = spO2,
        MeanArterialPressureMmHg = map,
    };

    /// <summary>A chart with settings, a gas and a check, as after a careful round.</summary>
    public static Chart Round() => new Chart().With(Aprv(), Gas(), Check());

    public Chart With(params Entry[] bodies)
    {
        foreach (var body in bodies)
        {
            Add(body);
        }

        return this;
    }

    public ChartEntry Add(Entry body, Guid? corrects = null)
    {
        var at = body.EffectiveAt() ?? Now;
        var entry = new ChartEntry(Id(++sequence), Guid.Empty, at, at + Duration.FromMinutes(2), "Tester", sequence, body) { Corrects = corrects };
        entries.Add(entry);
        return entry;
    }

    public Chart InContext(params Circumstance[] flags) => With([.. flags.Select(f => new ContextChange { Flag = f, From = AdmittedAt })]);

    public ChartWindow Window() => new(new EpisodeFacts(Guid.Empty, Unit.Id, "1", Patient, AdmittedAt, AdmittedAt), Unit, entries);

    public PatientPicture Picture(Instant? at = null) => PatientPicture.At(Window(), at ?? Now);

    public static Guid Id(long number) => new((uint)number, 0, 0x7000, 0x80, 0, 0, 0, 0, 0, 0, 0);
}
