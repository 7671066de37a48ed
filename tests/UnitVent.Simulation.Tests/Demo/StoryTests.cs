using NodaTime;
using UnitVent.Charting.Checking;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Episodes;

namespace UnitVent.Simulation.Tests.Demo;

/// <summary>Each bed's story is in what was charted.</summary>
public sealed class StoryTests
{
    [Fact]
    public void Bed1_SinceTheReleaseWasLengthened_EndsItBelow45PercentOfThePeak()
    {
        var ends = Demonstration.Bed("1").Of<VentilatorCheck>().Select(c => (c.Hour, Percent: EndPercent(c.Body))).ToList();

        Assert.All(ends.Where(e => e.Hour > 59), e => Assert.InRange(e.Percent, 25, 44.9));
        Assert.All(ends.Where(e => e.Hour < 58), e => Assert.InRange(e.Percent, 46, 70));
    }

    [Fact]
    public void Bed2_WithinADay_LosesThreeTenthsOfItsOxygenationAtEqualPressures()
    {
        var bed = Demonstration.Bed("2");
        var before = bed.Of<BloodGas>().Where(g => g.Hour is > 60 and < 83).Select(g => Pf(g.Body)).Average();

        Assert.InRange(Pf(bed.Of<BloodGas>()[^1].Body) / before, 0.55, 0.72);
        Assert.Single(bed.Of<SettingChange>().Select(s => (s.Body.PHighCmH2O, s.Body.PLowCmH2O, s.Body.THighS, s.Body.TLowS)).Distinct());
        Assert.All(bed.Of<VentilatorCheck>(), c => Assert.InRange((double)c.Body.SpO2Percent!, 88, 100));
    }

    [Fact]
    public void Bed3_OwnBreathingGone_KeepsCarbonDioxide()
    {
        var bed = Demonstration.Bed("3");
        var checks = bed.Of<VentilatorCheck>();
        var (own, tension) = (checks.Where(c => c.Hour is > 60 and < 89).Average(c => (double)c.Body.SpontaneousMinuteVolumeLMin!),
            bed.Of<BloodGas>().Where(g => g.Hour is > 60 and < 89).Average(g => (double)g.Body.PCO2!));

        Assert.InRange((double)checks[^1].Body.SpontaneousMinuteVolumeLMin! / own, 0, 0.25);
        Assert.InRange((double)bed.Of<BloodGas>()[^1].Body.PCO2! - tension, 10, 25);
        Assert.Equal(-4, bed.Of<BreathingCheck>()[^1].Body.Rass);
        Assert.Contains(bed.Of<BedsideEvent>(), e => e.Hour is > 89 and < 90 && e.Body.What == EventKind.SedationChanged);
    }

    [Fact]
    public void Bed4_Weaning_StepsPressureDownAndTimeUpAndBreathesMore()
    {
        var bed = Demonstration.Bed("4");
        var steps = bed.Of<SettingChange>().Select(s => s.Body).ToList();

        Assert.All(steps.Zip(steps.Skip(1)), pair => Assert.True(pair.Second.PHighCmH2O <= pair.First.PHighCmH2O && pair.Second.THighS >= pair.First.THighS));
        Assert.Equal((24m, 14m), (steps[0].PHighCmH2O!.Value, steps[^1].PHighCmH2O!.Value));
        Assert.True(OwnShare(bed.Of<VentilatorCheck>()[^1].Body) > OwnShare(bed.Of<VentilatorCheck>()[0].Body) + 30);
        Assert.All(bed.Of<VentilatorCheck>(), c => Assert.InRange((double)c.Body.SpO2Percent!, 92, 99));
    }

    [Theory]
    [InlineData("5", VentilationMode.PressureControl)]
    [InlineData("6", VentilationMode.PressureSupport)]
    [InlineData("14", VentilationMode.VolumeControl)]
    public void ConventionalBeds_Throughout_StayInTheirModeWithModestBreaths(string bed, VentilationMode mode)
    {
        var episode = Demonstration.Bed(bed);
        var weight = BodySize.PredictedWeightKg(episode.Admission.Patient)!.Value;

        Assert.All(episode.Of<SettingChange>(), s => Assert.Equal(mode, s.Body.Mode));
        Assert.All(episode.Of<VentilatorCheck>(), c => Assert.InRange((double)c.Body.TidalVolumeMl! / weight, 5, 8));
        Assert.All(episode.Of<VentilatorCheck>().Where(c => c.Body.PlateauPressureCmH2O is not null), c => Assert.InRange((double)c.Body.PlateauPressureCmH2O!, 10, 28));
    }

    [Fact]
    public void Bed7_LastGas_DoesNotFitItself() =>
        Assert.True(GasConsistency.Of(Demonstration.Bed("7").Of<BloodGas>()[^1].Body)!.BeyondRounding > GasConsistency.CautionBeyond);

    [Fact]
    public void Bed8_AtFirstLoad_HasBeenSilentForMoreThanSixHours() =>
        Assert.InRange((Demonstration.FirstLoad - Demonstration.Bed("8").Actions.Max(a => a.At)).TotalHours, 6, 8);

    [Theory]
    [InlineData("10", 46, 70)]
    [InlineData("11", 62, 88)]
    [InlineData("12", 46, 70)]
    [InlineData("15", 46, 70)]
    [InlineData("17", 46, 70)]
    public void QuietReleaseBeds_Throughout_StayWhereNothingIsRaised(string bed, double lowestEnd, double highestEnd)
    {
        var episode = Demonstration.Bed(bed);
        var weight = BodySize.PredictedWeightKg(episode.Admission.Patient)!.Value;

        Assert.All(episode.Of<VentilatorCheck>().Select(c => c.Body), c =>
        {
            Assert.InRange(EndPercent(c), lowestEnd, highestEnd);
            Assert.InRange((double)c.ReleaseVolumeMl! / weight, 4.8, 7.2);
            Assert.InRange(OwnShare(c), 12, 40);
            Assert.InRange((double)c.SpO2Percent!, 90, 98);
            Assert.InRange((double)c.MeanArterialPressureMmHg!, 65, 95);
        });
    }

    [Fact]
    public void Stories_AfterFourDays_ComeBack()
    {
        var weekLater = Demonstration.At(Demonstration.Origin + Duration.FromDays(11));

        Assert.Contains(Demonstration.Bed("2", weekLater).Of<BloodGas>(), g => Pf(g.Body) < 145);
        Assert.Contains(Demonstration.Bed("2", weekLater).Of<BloodGas>(), g => Pf(g.Body) > 165);
        Assert.Contains(Demonstration.Bed("3", weekLater).Of<BloodGas>(), g => g.Body.PCO2 >= 57);
        Assert.Contains(Demonstration.Bed("3", weekLater).Of<BloodGas>(), g => g.Body.PCO2 <= 48);
        Assert.Contains(Demonstration.Bed("4", weekLater).Of<SettingChange>(), s => s.Body.PHighCmH2O == 18);
        Assert.Contains(Demonstration.Bed("4", weekLater).Of<SettingChange>(), s => s.Body.PHighCmH2O == 14);
    }

    private static double Pf(BloodGas gas) => (double)(gas.PO2!.Value / gas.FiO2!.Value);

    private static double EndPercent(VentilatorCheck check) => 100 * (double)(check.EndReleaseFlowLMin!.Value / check.PeakExpiratoryFlowLMin!.Value);

    private static double OwnShare(VentilatorCheck check) => 100 * (double)(check.SpontaneousMinuteVolumeLMin!.Value / check.TotalMinuteVolumeLMin!.Value);
}
