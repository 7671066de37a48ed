using Microsoft.Extensions.DependencyInjection;
using NodaTime;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Episodes;
using UnitVent.Charting.Results;
using UnitVent.Store.Episodes;
using UnitVent.Store.People;
using UnitVent.Store.Recording;
using UnitVent.Store.Units;
using UnitVent.Testing;

namespace UnitVent.Store.Tests;

/// <summary>The store over a database of its own, with two units and people in them.</summary>
public sealed class TestStore : IAsyncLifetime
{
    private ServiceProvider? services;
    private TestDatabase? database;

    internal SteppingClock Clock { get; } = new(Instant.FromUtc(2026, 3, 10, 12, 0));

    internal Guid UnitId { get; private set; }

    internal Guid OtherUnitId { get; private set; }

    internal string Runtime => database!.RuntimeConnectionString;

    internal string Owner => database!.OwnerConnectionString;

    internal static CancellationToken Cancel => TestContext.Current.CancellationToken;

    internal Instant Now => Clock.Now;

    internal Actor Charge => With(UnitRole.ChargeTherapist);

    internal T Get<T>()
        where T : notnull => services!.GetRequiredService<T>();

    internal Actor With(UnitRole role, string name = "Tester") => new(Guid.NewGuid(), name, false, new Dictionary<Guid, UnitRole> { [UnitId] = role });

    internal Actor Stranger() => new(Guid.NewGuid(), "Stranger", false, new Dictionary<Guid, UnitRole> { [OtherUnitId] = UnitRole.Physician });

    public async ValueTask InitializeAsync()
    {
        database = await TestDatabase.CreateAsync();
        services = Build(database.RuntimeConnectionString, Clock);
        UnitId = Value(await Get<UnitDesk>().CreateAsync(UserDesk.CommandLine, new("ICU", "Test unit", "Europe/Zurich", [.. Enumerable.Range(1, 30).Select(i => $"{i}")]), Cancel));
        OtherUnitId = Value(await Get<UnitDesk>().CreateAsync(UserDesk.CommandLine, new("OTHER", "Other unit", "Etc/UTC", ["A"]), Cancel));
    }

    public async ValueTask DisposeAsync()
    {
        await services!.DisposeAsync();
        await database!.DisposeAsync();
    }

    internal static ServiceProvider Build(string runtime, IClock clock)
    {
        var collection = new ServiceCollection();
        collection.AddLogging();
        collection.AddSingleton(clock);
        collection.AddUnitVentStore(runtime);
        return collection.BuildServiceProvider();
    }

    internal static T Value<T>(Result<T> result) => result.Succeeded ? result.Value : throw new InvalidOperationException(string.Join("; ", result.Errors));

    internal async Task<Guid> AdmitAsync(string bed, string? mrn = null)
    {
        var admission = new Admission(Guid.CreateVersion7(), bed, new PatientFacts { Mrn = mrn ?? Guid.NewGuid().ToString("N"), FamilyName = "Granit", Sex = Sex.Male, HeightCm = 175 }, Now - Duration.FromDays(2));
        return Value(await Get<EpisodeDesk>().AdmitAsync(Charge, "ICU", admission, Cancel)).EpisodeId;
    }

    internal Task<Result<RecordReceipt>> RecordAsync(Guid episode, params NewEntry[] entries) => Get<ChartRecorder>().RecordAsync(Charge, episode, entries, Cancel);

    internal static NewEntry New(Entry body) => new(Guid.CreateVersion7(), body);

    internal SettingChange Aprv(double minutesAgo = 60, decimal high = 28) => new()
    {
        ChangedAt = Ago(minutesAgo),
        Mode = VentilationMode.Aprv,
        PHighCmH2O = high,
        PLowCmH2O = 5,
        THighS = 4.5m,
        TLowS = 0.5m,
        FiO2 = 0.5m,
    };

    internal BloodGas Gas(double minutesAgo = 30, decimal pO2 = 75) => new()
    {
        DrawnAt = Ago(minutesAgo),
        Specimen = Specimen.Arterial,
        TensionUnit = TensionUnit.MmHg,
        PH = 7.340m,
        PCO2 = 48,
        PO2 = pO2,
        FiO2 = 0.5m,
        BicarbonateMmolL = 25.5m,
    };

    internal VentilatorCheck Check(double minutesAgo = 25, decimal end = 60) => new()
    {
        ObservedAt = Ago(minutesAgo),
        SettingsConfirmed = true,
        PeakExpiratoryFlowLMin = 100,
        EndReleaseFlowLMin = end,
        FlowReadings = 3,
        ReleaseVolumeMl = 380,
        ReleasesAveraged = 3,
        SpO2Percent = 94,
        TotalMinuteVolumeLMin = 6.6m,
    };

    private Instant Ago(double minutes) => Now - Duration.FromMinutes(minutes);
}
