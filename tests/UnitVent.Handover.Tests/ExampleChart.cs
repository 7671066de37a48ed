using NodaTime;
using UnitVent.Charting.Bands;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Episodes;
using UnitVent.Charting.Flags;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Rules;
using UnitVent.Charting.Windows;

namespace UnitVent.Handover.Tests;

/// <summary>An invented patient on the fourth day of APRV, with a full chart.</summary>
internal static class ExampleChart
{
    public static readonly Instant Now = Instant.FromUtc(2026, 11, 30, 13, 5);
    public static readonly UnitProfile Unit = new(Guid.CreateVersion7(), "NORTH", "Unit North", DateTimeZoneProviders.Tzdb["Europe/Vienna"])
    {
        Beds = ["10", "9", "4"],
        IsDemo = true,
    };

    public static readonly EpisodeFacts Episode = new(
        Guid.CreateVersion7(),
        Unit.Id,
        "4",
        new PatientFacts
        {
            Mrn = "000123",
            FamilyName = "Żółć-Example",
            GivenName = "Anna",
            BirthDate = new LocalDate(1961, 3, 3),
            Sex = Sex.Female,
            HeightCm = 168,
        },
        Ago(77),
        Ago(76))
    {
        Reason = "Pneumonia with septic shock",
    };

    public static SheetInput Full { get; } = Input(Window(Entries()));

    public static SheetInput Empty { get; } = Input(Window([]));

    public static Instant Ago(double hours) => Now - Duration.FromHours(hours);

    public static ChartWindow Window(IEnumerable<Entry> entries, EpisodeFacts? episode = null) => new(
        episode ?? Episode,
        Unit,
        entries.Select((entry, i) => new ChartEntry(Guid.CreateVersion7(), Episode.Id, entry.EffectiveAt() ?? Ago(1), Ago(0), "R. Therapist", i, entry)));

    public static SheetInput Input(ChartWindow window) =>
        new(PatientPicture.At(window, Now), Now, "R. Therapist") { DayBefore = PatientPicture.At(window, Ago(24)) };

    public static IEnumerable<Entry> Entries() =>
    [
        Aprv(50, 28, 0.6m, 5.0m),
        Aprv(30, 28, 0.55m, 5.2m),
        Aprv(7, 26, 0.5m, 5.5m),
        Gas(40, 7.29m, 56, 78, 0.6m),
        Gas(26, 7.31m, 54, 84, 0.55m),
        Gas(19.5, 7.30m, 53, 88, null),
        Gas(8, 7.33m, 50, 81, null),
        Gas(2, 7.35m, 48, 79, 0.5m),
        Gas(1, 7.28m, 61, 41, 0.5m) with { Specimen = Specimen.Venous },
        new VentilatorCheck
        {
            ObservedAt = Ago(1.5),
            SettingsConfirmed = true,
            TotalMinuteVolumeLMin = 8.4m,
            ReleaseVolumeMl = 390,
            PeakExpiratoryFlowLMin = 62,
            EndReleaseFlowLMin = 33,
            TotalRatePerMin = 24,
            SpO2Percent = 93,
            MeanAirwayPressureCmH2O = 24,
        },
        new BreathingCheck { ObservedAt = Ago(1.5), Rass = -2, Effort = Effort.Easy, Relaxant = Relaxant.None },
        new AirwayCheck
        {
            ObservedAt = Ago(5),
            Airway = AirwayKind.Oral,
            SizeMm = 7.5m,
            DepthCm = 22,
            CuffPressureCmH2O = 26,
            Humidifier = Humidifier.Heated,
            TubeFixedAt = "left corner of the mouth",
        },
        new ContextChange { Flag = Circumstance.Ards, From = Ago(70) },
        new ContextChange { Flag = Circumstance.DifficultAirway, From = Ago(76), Reason = "Two attempts, video laryngoscope, bougie." },
        new TargetSet
        {
            From = Ago(20),
            Reason = "ARDS",
            SpO2LowPercent = 90,
            SpO2HighPercent = 95,
            PaCO2LowMmHg = 40,
            PaCO2HighMmHg = 60,
            PHFloor = 7.20m,
            PHighLimitCmH2O = 30,
            RassLow = -2,
            RassHigh = 0,
        },
        new BedsideEvent { At = Ago(36), What = EventKind.Prone },
        new BedsideEvent { At = Ago(20), What = EventKind.Supine },
        new Note { At = Ago(3), Text = "If saturation stays below 88 % for five minutes after suction: call the charge therapist, ext. 4411." },
        new FollowUp { What = "Gas after the change of P high", DueAt = Ago(-2), ForRole = "nurse" },
        new FollowUp { What = "Chest film looked at", DueAt = Ago(1), ForRole = "physician" },
    ];

    public static Flag OpenFlag(Severity severity, string says, Acknowledgement? inHand = null) => new(
        Guid.CreateVersion7(), Episode.Id, new Finding("R24", Family.Oxygen, severity, says, "", Ago(2), new Dictionary<string, double>(), []), Ago(2))
    {
        InHand = inHand,
    };

    public static UnitSheetPatient InBed(string bed, Band band, string why, Instant? since = null) =>
        new(PatientPicture.At(Window(Entries(), Episode with { Bed = bed }), Now), new Standing(band, why, since, []));

    private static SettingChange Aprv(double hoursAgo, decimal pHigh, decimal fiO2, decimal tHigh) => new()
    {
        ChangedAt = Ago(hoursAgo),
        Mode = VentilationMode.Aprv,
        PHighCmH2O = pHigh,
        PLowCmH2O = 0,
        THighS = tHigh,
        TLowS = 0.55m,
        FiO2 = fiO2,
        ReleaseEndedBy = ReleaseEnd.Time,
        TubeCompensation = TubeCompensation.On,
        TubeCompensationPercent = 100,
    };

    private static BloodGas Gas(double hoursAgo, decimal pH, decimal pCO2, decimal pO2, decimal? fiO2) => new()
    {
        DrawnAt = Ago(hoursAgo),
        Specimen = Specimen.Arterial,
        TensionUnit = TensionUnit.MmHg,
        PH = pH,
        PCO2 = pCO2,
        PO2 = pO2,
        FiO2 = fiO2,
        LactateMmolL = 1.8m,
    };
}
