using CsCheck;
using static UnitVent.Physiology.Tests.Given;

namespace UnitVent.Physiology.Tests;

/// <summary>Worked values from Marini JJ, Ravenscraft SA. Crit Care Med 1992;20:1461-1472, and the time-weighted identity.</summary>
public sealed class MeanAirwayPressureTests
{
    /// <summary>P high, P low, T high, T low, mean.</summary>
    public static TheoryData<double, double, double, double, double> PublishedAprv => new()
    {
        { 30, 0, 5.0, 0.5, 27.27 },
        { 28, 0, 4.5, 0.5, 25.20 },
        { 25, 5, 4.0, 0.8, 21.67 },
        { 35, 0, 6.0, 0.6, 31.82 },
        { 24, 0, 5.5, 0.5, 22.00 },
    };

    /// <summary>Peak above atmosphere, PEEP, Ti, rate, rise time, mean.</summary>
    public static TheoryData<double, double, double, double, double, double> PublishedPressureControl => new()
    {
        { 30, 10, 1.0, 20, 0, 16.67 },
        { 25, 8, 0.9, 24, 0, 14.12 },
        { 30, 10, 1.0, 20, 0.2, 16.00 },
        { 35, 15, 1.5, 20, 0, 25.00 },
    };

    /// <summary>Peak, plateau, PEEP, flow time, pause, rate, mean.</summary>
    public static TheoryData<double, double, double, double, double, double, double> PublishedVolumeControl => new()
    {
        { 30, 25, 10, 0.8, 0, 20, 13.33 },
        { 30, 25, 10, 0.8, 0.2, 20, 14.33 },
        { 24, 20, 5, 1.0, 0, 16, 8.07 },
    };

    [Theory, MemberData(nameof(PublishedAprv))]
    public void Aprv_OnPublishedSettings_ReturnsPublishedMean(double high, double low, double timeHigh, double timeLow, double expected)
        => Assert.Equal(expected, Aprv(high, low, timeHigh, timeLow), 0.0051);

    [Theory, MemberData(nameof(PublishedPressureControl))]
    public void PressureControl_OnPublishedSettings_ReturnsPublishedMean(double peak, double peep, double ti, double rate, double rise, double expected)
        => Assert.Equal(expected, PressureControl(peep, peak - peep, ti, rate, rise), 0.0051);

    [Theory, MemberData(nameof(PublishedVolumeControl))]
    public void VolumeControl_OnPublishedSettings_ReturnsPublishedMean(
        double peak, double plateau, double peep, double flow, double pause, double rate, double expected)
        => Assert.Equal(expected, VolumeControl(peak, plateau, peep, flow, pause, rate), 0.0051);

    [Fact]
    public void Aprv_OfAnySettings_LiesBetweenItsTwoLevels()
        => Gen.Select(Gen.Double[0.01, 170], Gen.Double[-20, 129], Gen.Double[0.01, 50], Gen.Double[0.01, 50]).Sample((step, low, timeHigh, timeLow) =>
        {
            var high = Math.Min(low + step, 150);
            var mean = Aprv(high, low, timeHigh, timeLow);
            return mean >= low - 1e-9 && mean <= high + 1e-9;
        });

    [Fact]
    public void VolumeControl_OfAnySettings_LiesBetweenPeepAndPeak()
        => Gen.Select(Gen.Double[0, 30], Gen.Double[0.1, 40], Gen.Double[0, 40], Gen.Double[0, 1]).Sample((peep, elastic, resistive, flow) =>
        {
            var mean = VolumeControl(peep + elastic + resistive, peep + elastic, peep, flow, 1 - flow, 60);
            return mean >= peep - 1e-9 && mean <= peep + elastic + resistive + 1e-9;
        });

    [Fact]
    public void Aprv_AroundItsLimits_RefusesWhatIsNoRelease()
    {
        Assert.InRange(Aprv(10.1, 10, 5, 0.5), 10, 10.1);
        Expect.Refused(() => Aprv(10, 10, 5, 0.5));
        Expect.Refused(() => Aprv(9, 10, 5, 0.5));
        Expect.Refused(() => Aprv(28, 0, 0, 0.5));
        Expect.Refused(() => Aprv(28, 0, 5, 0));
    }

    [Fact]
    public void PressureControl_AroundItsLimits_RefusesOutside()
    {
        Assert.Equal(10, PressureControl(10, 0, 1, 20, 0), 1e-9);
        Assert.Equal(30, PressureControl(10, 20, 3, 20, 0), 1e-9);
        Assert.Equal(20, PressureControl(10, 20, 3, 20, 3), 1e-9);
        Expect.Refused(() => PressureControl(10, -0.1, 1, 20, 0));
        Expect.Refused(() => PressureControl(10, 20, 3.01, 20, 0));
        Expect.Refused(() => PressureControl(10, 20, 1, 20, 1.01));
        Expect.Refused(() => PressureControl(10, 20, 1, 0, 0));
    }

    [Fact]
    public void VolumeControl_AroundItsLimits_RefusesOutside()
    {
        Assert.Equal(17.5, VolumeControl(25, 25, 10, 3, 0, 20), 1e-9);
        Expect.Refused(() => VolumeControl(24.9, 25, 10, 1, 0, 20));
        Expect.Refused(() => VolumeControl(30, 10, 10, 1, 0, 20));
        Expect.Refused(() => VolumeControl(30, 25, 10, 2, 1.01, 20));
        Expect.Refused(() => VolumeControl(30, 25, 10, 1, 0, 0));
    }

    private static double Aprv(double high, double low, double timeHigh, double timeLow)
        => MeanAirwayPressure.Aprv(CmH2O(high), CmH2O(low), Seconds(timeHigh), Seconds(timeLow)).CmH2O;

    private static double PressureControl(double peep, double above, double ti, double rate, double rise)
        => MeanAirwayPressure.PressureControl(CmH2O(peep), CmH2O(above), Seconds(ti), PerMin(rate), Seconds(rise)).CmH2O;

    private static double VolumeControl(double peak, double plateau, double peep, double flow, double pause, double rate)
        => MeanAirwayPressure.VolumeControl(CmH2O(peak), CmH2O(plateau), CmH2O(peep), Seconds(flow), Seconds(pause), PerMin(rate)).CmH2O;
}
