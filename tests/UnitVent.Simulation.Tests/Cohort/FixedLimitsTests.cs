using NodaTime;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Episodes;
using UnitVent.Charting.Windows;
using UnitVent.Simulation.Cohort;

namespace UnitVent.Simulation.Tests.Cohort;

public sealed class FixedLimitsTests
{
    private static readonly Instant Start = Instant.FromUtc(2026, 3, 2, 6, 0);

    public static TheoryData<VentilatorCheck, string> ChecksOutsideOneLimit { get; } = new()
    {
        { new() { SpO2Percent = 89 }, "SpO2 < 90" },
        { new() { ReleaseVolumeMl = 561 }, "release volume > 8 or < 4 mL/kg" },
        { new() { ReleaseVolumeMl = 279 }, "release volume > 8 or < 4 mL/kg" },
        { new() { PeakExpiratoryFlowLMin = 100, EndReleaseFlowLMin = 39 }, "end-release flow < 40 or > 80 %" },
        { new() { PeakExpiratoryFlowLMin = 100, EndReleaseFlowLMin = 81 }, "end-release flow < 40 or > 80 %" },
        { new() { TotalRatePerMin = 31 }, "total rate > 30" },
        { new() { SpontaneousMinuteVolumeLMin = 0.5m, TotalMinuteVolumeLMin = 6 }, "own share < 10 %" },
        { new() { MeanArterialPressureMmHg = 64 }, "mean arterial pressure < 65" },
    };

    private static VentilatorCheck Inside { get; } = new()
    {
        SpO2Percent = 90,
        ReleaseVolumeMl = 560,
        PeakExpiratoryFlowLMin = 100,
        EndReleaseFlowLMin = 40,
        TotalRatePerMin = 30,
        SpontaneousMinuteVolumeLMin = 0.6m,
        TotalMinuteVolumeLMin = 6,
        MeanArterialPressureMmHg = 65,
    };

    [Theory]
    [MemberData(nameof(ChecksOutsideOneLimit))]
    public void Cards_OutsideALimitTwiceAndBackInside_OpenOnceAndClose(VentilatorCheck outside, string limit)
    {
        var card = Assert.Single(FixedLimits.Cards(Chart(outside, outside, Inside), weightKg: 70));

        Assert.Equal(limit, card.Rule);
        Assert.Equal((Start, Start + Duration.FromHours(4)), (card.OpenedAt, card.ClosedAt!.Value));
    }

    [Fact]
    public void Cards_AtEveryLimit_AreNone() => Assert.Empty(FixedLimits.Cards(Chart(Inside), weightKg: 70));

    [Theory]
    [InlineData(61, 7.30, 80, "PaCO2 > 60 or pH < 7.25")]
    [InlineData(60, 7.24, 80, "PaCO2 > 60 or pH < 7.25")]
    [InlineData(60, 7.25, 74, "P/F < 150")]
    public void Cards_GasOutsideALimit_OpenOne(int pCO2, double pH, int pO2, string limit) =>
        Assert.Equal(limit, Assert.Single(FixedLimits.Cards(Chart(new BloodGas { PCO2 = pCO2, PH = (decimal)pH, PO2 = pO2, FiO2 = 0.5m }), weightKg: 70)).Rule);

    private static ChartWindow Chart(params Entry[] bodies)
    {
        var unit = new UnitProfile(Guid.NewGuid(), "STUDY", "Cohort study", DateTimeZone.Utc);
        var episode = new EpisodeFacts(Guid.NewGuid(), unit.Id, "1", new PatientFacts(), Start, Start);
        return new(episode, unit, bodies.Select((body, i) =>
        {
            var at = Start + Duration.FromHours(2 * i);
            return new ChartEntry(Guid.NewGuid(), episode.Id, at, at, "Demo Nurse", i + 1, body);
        }));
    }
}
