using UnitVent.Charting.Trends;

namespace UnitVent.Charting.Tests.Trends;

/// <summary>How often a drift is called in simulated series: gases every four hours, an hour early or late, normal scatter, a fixed seed.</summary>
public sealed class DriftSimulationTests
{
    private const int Runs = 2000;

    /// <summary>
    /// Points, scatter in % and true change in % of P/F (start 200); the share of runs expected in %, computed once from 20,000 runs. Scatters: 5 % of stable
    /// patients (Chest 1983;84:14) and the 95th centile 9.8 % (J Clin Monit 1992;8:111). Bounds are broad: four standard errors and a point.
    /// </summary>
    public static TheoryData<int, double, double, double> SharesOfPf => new()
    {
        { 4, 5, 0, 1.1 }, { 5, 5, 0, 1.3 }, { 6, 5, 0, 0.8 }, { 8, 5, 0, 0.7 },
        { 4, 9.8, 0, 5.4 }, { 5, 9.8, 0, 5.7 }, { 6, 9.8, 0, 3.9 }, { 8, 9.8, 0, 4.8 },
        { 4, 5, -25, 71 }, { 5, 5, -25, 85 }, { 6, 5, -25, 87 }, { 8, 5, -25, 97 },
        { 4, 9.8, -25, 35 }, { 5, 9.8, -25, 44 }, { 6, 9.8, -25, 42 }, { 8, 9.8, -25, 59 },
        { 4, 5, -40, 95 }, { 8, 5, -40, 100 }, { 4, 9.8, -40, 66 }, { 8, 9.8, -40, 94 },
    };

    [Theory, MemberData(nameof(SharesOfPf))]
    public void Pf_IsCalledDriftingAsOftenAsExpected(int count, double scatter, double change, double expected) =>
        Near(expected, Share(DriftVariables.PfRatio, 200, count, scatter, change, d => d.Verdict == DriftVerdict.Drifting));

    /// <summary>The same for PaCO2 from 45 mmHg with 3 % (Chest 1983;84:14).</summary>
    public static TheoryData<int, double, double> SharesOfPaCO2 => new() { { 4, 0, 0.5 }, { 6, 0, 0.5 }, { 4, 20, 75 }, { 5, 20, 87 }, { 6, 20, 90 } };

    [Theory, MemberData(nameof(SharesOfPaCO2))]
    public void PaCO2_IsCalledDriftingAsOftenAsExpected(int count, double change, double expected) =>
        Near(expected, Share(DriftVariables.PaCO2, 45, count, 3, change, d => d.Verdict == DriftVerdict.Drifting));

    /// <summary>The trend test by itself calls 6–9 % of stable series: what the size adds.</summary>
    [Theory]
    [InlineData(4, 8.3)]
    [InlineData(6, 5.6)]
    [InlineData(8, 6.1)]
    public void TrendAlone_CallsMoreByChance(int count, double expected) =>
        Near(expected, Share(DriftVariables.PfRatio, 200, count, 5, 0, d => d.Trend!.P <= Drift.Level));

    private static void Near(double expected, double actual)
    {
        var reach = 1 + 400 * Math.Sqrt(expected / 100 * (1 - expected / 100) / Runs);
        Assert.InRange(actual, expected - reach, expected + reach);
    }

    private static double Share(DriftVariable variable, double start, int count, double scatter, double change, Func<Drift, bool> counts)
    {
        var random = new Random(20260310);
        return 100.0 * Enumerable.Range(0, Runs).Count(_ => counts(Series(random, variable, start, count, scatter, change))) / Runs;
    }

    private static Drift Series(Random random, DriftVariable variable, double start, int count, double scatter, double change)
    {
        double[] hours = [.. Enumerable.Range(0, count).Select(i => 4.0 * i + 2 * random.NextDouble() - 1)];
        double[] values = [.. hours.Select(h => start * (1 + change / 100 * (h - hours[0]) / (hours[^1] - hours[0])) * (1 + scatter / 100 * Normal(random)))];
        return DriftTests.Of(variable, hours, values);
    }

    private static double Normal(Random random) => Math.Sqrt(-2 * Math.Log(1 - random.NextDouble())) * Math.Cos(2 * Math.PI * random.NextDouble());
}
