using BenchmarkDotNet.Attributes;
using NodaTime;
using UnitVent.Charting.Trends;

namespace UnitVent.Benchmarks;

/// <summary>The verdict on one series: slope with its interval, test, size.</summary>
[MemoryDiagnoser]
[Config(typeof(InThisProcess))]
public class DriftBenchmarks
{
    private static readonly Instant Start = Instant.FromUtc(2026, 3, 10, 12, 0);

    private SeriesPoint[] points = [];

    /// <summary>How many points: a day of gases, a day of half-hourly readings, and twice what the longest window can hold.</summary>
    [Params(8, 48, 200)]
    public int Count { get; set; }

    /// <summary>A falling P/F with scatter, always the same.</summary>
    [GlobalSetup]
    public void SetUp()
    {
        points = [.. Enumerable.Range(0, Count).Select(i => new SeriesPoint(Start + Duration.FromMinutes(35 * i), 220 - 60.0 * i / Count + 8 * Math.Sin(2.4 * i)))];
        if (Drift.Of(points, DriftVariables.PfRatio) is not { Verdict: DriftVerdict.Drifting, Count: var count } || count != Count)
        {
            throw new InvalidOperationException("The series is not the one that was meant.");
        }
    }

    /// <summary>The verdict.</summary>
    [Benchmark]
    public DriftVerdict Verdict() => Drift.Of(points, DriftVariables.PfRatio).Verdict;
}
