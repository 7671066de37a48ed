using BenchmarkDotNet.Attributes;
using BenchmarkDotNet.Configs;
using BenchmarkDotNet.Jobs;
using BenchmarkDotNet.Toolchains.InProcess.Emit;
using Microsoft.Extensions.DependencyInjection;
using NodaTime;
using Npgsql;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Episodes;
using UnitVent.Store;
using UnitVent.Store.Episodes;
using UnitVent.Store.Live;
using UnitVent.Store.People;
using UnitVent.Store.Recording;
using UnitVent.Store.Units;
using UnitVent.Testing;

namespace UnitVent.Benchmarks;

/// <summary>A ward of 500 patients with a day of charting on PostgreSQL: one entry recorded with everything that follows from it, and the pass over what time alone made due.</summary>
[MemoryDiagnoser]
[Config(typeof(OnceAnIteration))]
public class EvaluationBenchmarks
{
    private const int Patients = 500;
    private const int AtOnce = 25;
    private const string Unit = "BENCH";

    private readonly List<Guid> episodes = [];
    private TestDatabase? database;
    private ServiceProvider? services;
    private Actor? actor;
    private Guid unitId;
    private int next;

    private static Instant Now => SystemClock.Instance.GetCurrentInstant();

    /// <summary>Admits and charts.</summary>
    [GlobalSetup]
    public async Task SetUpAsync()
    {
        database = await TestDatabase.CreateAsync();
        var collection = new ServiceCollection().AddLogging().AddSingleton<NodaTime.IClock>(SystemClock.Instance);
        collection.AddUnitVentStore(database.RuntimeConnectionString);
        services = collection.BuildServiceProvider();
        var beds = Enumerable.Range(1, Patients).Select(i => $"{i}").ToList();
        unitId = (await services.GetRequiredService<UnitDesk>().CreateAsync(UserDesk.CommandLine, new(Unit, "Invented unit", "Etc/UTC", beds), default)).Value;
        actor = new(Guid.NewGuid(), "Invented", false, new Dictionary<Guid, UnitRole> { [unitId] = UnitRole.ChargeTherapist });
        foreach (var bed in beds)
        {
            episodes.Add(await ChartAsync(bed));
        }
    }

    /// <summary>Drops the database.</summary>
    [GlobalCleanup]
    public async Task CleanUpAsync()
    {
        await services!.DisposeAsync();
        await database!.DisposeAsync();
    }

    /// <summary>A check of one patient: checked, recorded, picture, rules, flags written, audited, told, committed. One patient after the other.</summary>
    [Benchmark(OperationsPerInvoke = AtOnce)]
    public async Task RecordOneAsync()
    {
        for (var i = 0; i < AtOnce; i++)
        {
            _ = (await RecordAsync(episodes[next++ % Patients], Check(Now - Duration.FromMinutes(1)))).Value;
        }
    }

    /// <summary>Makes all of them due, as after a stop.</summary>
    [IterationSetup(Target = nameof(EvaluateDueAsync))]
    public void MakeAllDue()
    {
        using var connection = new NpgsqlConnection(database!.RuntimeConnectionString);
        connection.Open();
        using var command = new NpgsqlCommand($"select set_config('unitvent.unit', '{unitId}', false); update episode set next_evaluation_at = now()", connection);
        command.ExecuteNonQuery();
    }

    /// <summary>The pass over 500 patients that are all due.</summary>
    [Benchmark]
    public async Task<int> EvaluateDueAsync() => await services!.GetRequiredService<DueEvaluator>().EvaluateDueAsync(default) is Patients
        ? Patients
        : throw new InvalidOperationException("Not all were evaluated.");

    private async Task<Guid> ChartAsync(string bed)
    {
        var patient = new PatientFacts { Mrn = "B" + bed, FamilyName = "Granit", Sex = Sex.Male, HeightCm = 175 };
        var episode = (await services!.GetRequiredService<EpisodeDesk>().AdmitAsync(actor!, Unit, new(Guid.CreateVersion7(), bed, patient, Now - Duration.FromDays(2)), default)).Value.EpisodeId;
        var begin = Now - Duration.FromHours(20);
        List<Entry> entries =
        [
            new SettingChange { ChangedAt = begin, Mode = VentilationMode.Aprv, PHighCmH2O = 27, PLowCmH2O = 0, THighS = 4.5m, TLowS = 0.5m, FiO2 = 0.45m },
            .. Enumerable.Range(0, 10).Select(i => Check(begin + Duration.FromMinutes(5 + (i * 118)))),
            .. Enumerable.Range(0, 5).Select(i => Gas(begin + Duration.FromMinutes(65 + (i * 230)), 80 + i)),
        ];
        var recorded = await RecordAsync(episode, [.. entries]);
        return recorded.Succeeded ? episode : throw new InvalidOperationException(string.Join(' ', recorded.Errors));
    }

    private Task<Charting.Results.Result<RecordReceipt>> RecordAsync(Guid episode, params Entry[] entries) =>
        services!.GetRequiredService<ChartRecorder>().RecordAsync(actor!, episode, [.. entries.Select(e => new NewEntry(Guid.CreateVersion7(), e) { Confirmed = ["ask.effectiveAt", "ask.observedAt", "ask.drawnAt"] })], default);

    private static VentilatorCheck Check(Instant at) => new()
    {
        ObservedAt = at,
        SettingsConfirmed = true,
        TotalMinuteVolumeLMin = 7,
        ReleaseVolumeMl = 420,
        ReleasesAveraged = 3,
        FlowReadings = 3,
        PeakExpiratoryFlowLMin = 60,
        EndReleaseFlowLMin = 36,
        SpO2Percent = 94,
        MeanArterialPressureMmHg = 74,
        MeanAirwayPressureCmH2O = 24,
        SpontaneousRatePerMin = 12,
    };

    private static BloodGas Gas(Instant at, decimal pO2) => new()
    {
        DrawnAt = at,
        Specimen = Specimen.Arterial,
        TensionUnit = TensionUnit.MmHg,
        PH = 7.37m,
        PCO2 = 45,
        PO2 = pO2,
        BicarbonateMmolL = 25.5m,
        HaemoglobinGDl = 10,
    };

    private sealed class OnceAnIteration : ManualConfig
    {
        public OnceAnIteration() => AddJob(Job.Default
            .WithToolchain(InProcessEmitToolchain.Instance).WithInvocationCount(1).WithUnrollFactor(1).WithWarmupCount(10).WithIterationCount(40));
    }
}
