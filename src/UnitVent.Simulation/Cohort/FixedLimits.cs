using UnitVent.Charting.Entries;
using UnitVent.Charting.Rules;
using UnitVent.Charting.Windows;

namespace UnitVent.Simulation.Cohort;

/// <summary>The baseline: plain fixed limits on what was charted. Each crossing opens a card, which closes with the next value inside.</summary>
internal static class FixedLimits
{
    private static readonly FixedLimit[] All =
    [
        new("SpO2 < 90", Family.Oxygen, (e, _) => e is VentilatorCheck { SpO2Percent: { } spO2 } ? spO2 < 90 : null),
        new("PaCO2 > 60 or pH < 7.25", Family.CarbonDioxide, (e, _) => e is BloodGas { PCO2: { } pCO2, PH: { } pH } ? pCO2 > 60 || pH < 7.25m : null),
        new("P/F < 150", Family.Collapse, (e, _) => e is BloodGas { PO2: { } pO2, FiO2: { } fiO2 } ? pO2 / fiO2 < 150 : null),
        new("release volume > 8 or < 4 mL/kg", Family.VolumeAndPressure, (e, kg) => e is VentilatorCheck { ReleaseVolumeMl: { } volume } ? (double)volume > 8 * kg || (double)volume < 4 * kg : null),
        new("end-release flow < 40 or > 80 %", Family.Timing, (e, _) => e is VentilatorCheck { PeakExpiratoryFlowLMin: { } peak, EndReleaseFlowLMin: { } end } ? end / peak is < 0.4m or > 0.8m : null),
        new("total rate > 30", Family.Effort, (e, _) => e is VentilatorCheck { TotalRatePerMin: { } rate } ? rate > 30 : null),
        new("own share < 10 %", Family.Drive, (e, _) => e is VentilatorCheck { SpontaneousMinuteVolumeLMin: { } own, TotalMinuteVolumeLMin: { } total } ? own / total < 0.1m : null),
        new("mean arterial pressure < 65", Family.Circulation, (e, _) => e is VentilatorCheck { MeanArterialPressureMmHg: { } pressure } ? pressure < 65 : null),
    ];

    public static IReadOnlyList<CardLife> Cards(ChartWindow chart, double weightKg) =>
        [.. All.SelectMany(limit => Cards(limit, chart, weightKg)).OrderBy(c => c.OpenedAt)];

    private static List<CardLife> Cards(FixedLimit limit, ChartWindow chart, double weightKg)
    {
        var lives = new List<CardLife>();
        foreach (var entry in chart.Standing.OrderBy(e => e.RecordedAt))
        {
            var open = lives.Count > 0 && lives[^1].ClosedAt is null;
            if (limit.IsOutside(entry.Body, weightKg) is not { } outside || outside == open)
            {
                continue;
            }

            if (outside)
            {
                lives.Add(new(limit.Family, limit.Name, entry.RecordedAt, null));
            }
            else
            {
                lives[^1] = lives[^1] with { ClosedAt = entry.RecordedAt };
            }
        }

        return lives;
    }

    /// <summary>One limit: whether an entry is outside it, null when the entry says nothing about it.</summary>
    private sealed record FixedLimit(string Name, Family Family, Func<Entry, double, bool?> IsOutside);
}
