using NodaTime;
using UnitVent.Charting.Bands;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Episodes;
using UnitVent.Charting.Flags;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Rules;
using UnitVent.Charting.Windows;
using UnitVent.Web.Board;

namespace UnitVent.Web.Tests.Screens;

/// <summary>A chart for the screens: fixed, synthetic, at fixed minutes before now. Berlin clocks, so that zone and UTC differ.</summary>
internal static class ScreenChart
{
    public static readonly DateTimeZone Berlin = DateTimeZoneProviders.Tzdb["Europe/Berlin"];

    /// <summary>14:05 on the unit's clocks.</summary>
    public static readonly Instant Now = Instant.FromUtc(2026, 12, 1, 13, 5);

    public static readonly UnitProfile Unit = new(Guid.Parse("00000000-0000-7000-8000-000000000001"), "T", "Test unit", Berlin) { Beds = ["1", "2", "3", "4"] };

    public static Instant Ago(double minutes) => Now - Duration.FromMinutes(minutes);

    public static SettingChange Aprv(double minutesAgo, decimal high = 28, decimal fiO2 = 0.5m) => new()
    {
        ChangedAt = Ago(minutesAgo),
        Mode = VentilationMode.Aprv,
        PHighCmH2O = high,
        PLowCmH2O = 5,
        THighS = 4.5m,
        TLowS = 0.5m,
        FiO2 = fiO2,
        TubeCompensation = TubeCompensation.On,
    };

    public static BloodGas Gas(double minutesAgo, decimal pO2, decimal pH = 7.40m, Specimen specimen = Specimen.Arterial) => new()
    {
        DrawnAt = Ago(minutesAgo),
        Specimen = specimen,
        TensionUnit = TensionUnit.MmHg,
        PH = pH,
        PCO2 = 45,
        PO2 = pO2,
    };

    public static VentilatorCheck Check(double minutesAgo) => new()
    {
        ObservedAt = Ago(minutesAgo),
        SettingsConfirmed = true,
        TotalMinuteVolumeLMin = 6.6m,
        TotalRatePerMin = 22,
        ReleaseVolumeMl = 420,
        ReleasesAveraged = 3,
        PeakExpiratoryFlowLMin = 60,
        EndReleaseFlowLMin = 33,
        FlowReadings = 3,
        SpO2Percent = 93,
    };

    public static PatientPicture Picture(params Entry[] bodies) => Picture("1", bodies);

    public static PatientPicture Picture(string bed, params Entry[] bodies)
    {
        var patient = new PatientFacts { Mrn = "M-1", FamilyName = "Granit", GivenName = "Ida", Sex = Sex.Female, HeightCm = 165 };
        var episode = new EpisodeFacts(Guid.CreateVersion7(), Unit.Id, bed, patient, Ago(2 * 24 * 60), Ago(2 * 24 * 60));
        var entries = bodies.Select((b, i) => new ChartEntry(Guid.CreateVersion7(), episode.Id, b.EffectiveAt() ?? Now, b.EffectiveAt() ?? Now, "N. Nurse", i + 1, b));
        return PatientPicture.At(new ChartWindow(episode, Unit, entries), Now);
    }

    public static Flag Flag(Severity severity, string says, Acknowledgement? inHand = null, Family family = Family.Oxygen) => new(
        Guid.CreateVersion7(),
        Guid.Empty,
        new Finding("R25", family, severity, says, "position, secretions", Ago(20), new Dictionary<string, double>(), []),
        Ago(20))
    { InHand = inHand };

    public static PatientRow Row(PatientPicture picture, params Flag[] open) => new(picture, Standing.Of(open, picture), Now);
}
