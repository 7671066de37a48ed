using static UnitVent.Physiology.Tests.Given;

namespace UnitVent.Physiology.Tests;

public sealed class MechanicalPowerTests
{
    /// <summary>Worked from Gattinoni L, et al. Intensive Care Med 2016;42:1567-1575, short form: rate, L, peak, driving, J/min.</summary>
    public static TheoryData<double, double, double, double, double> PublishedVolumeControlled => new()
    {
        { 20, 0.42, 30, 14, 18.93 },
        { 15, 0.50, 25, 12, 13.96 },
        { 25, 0.36, 35, 16, 23.81 },
    };

    /// <summary>The long form of the same paper: rate, L, elastance cmH2O/L, I:E, resistance, PEEP, J/min.</summary>
    public static TheoryData<double, double, double, double, double, double, double> PublishedLongForm => new()
    {
        { 20, 0.42, 33.33, 0.5, 10, 12, 19.10 },
        { 15, 0.50, 25, 0.5, 8, 5, 10.47 },
    };

    /// <summary>Worked from Becher T, et al. Intensive Care Med 2019;45:1321-1323: rate, L, above PEEP, PEEP, J/min.</summary>
    public static TheoryData<double, double, double, double, double> PublishedPressureControlled => new()
    {
        { 20, 0.42, 15, 10, 20.58 },
        { 24, 0.38, 14, 12, 23.24 },
        { 16, 0.50, 12, 8, 15.68 },
    };

    [Theory, MemberData(nameof(PublishedVolumeControlled))]
    public void VolumeControlled_OnPublishedBreath_ReturnsPublishedPower(double rate, double litres, double peak, double driving, double expected)
        => Assert.Equal(expected, MechanicalPower.VolumeControlled(PerMin(rate), Ml(litres * 1000), CmH2O(peak), CmH2O(driving)), 0.0051);

    [Theory, MemberData(nameof(PublishedLongForm))]
    public void FromMechanics_OnPublishedBreath_ReturnsPublishedPowerAndThatOfTheShortForm(
        double rate, double litres, double elastance, double ratio, double resistance, double peep, double expected)
    {
        var inspiratorySeconds = 60 / rate * ratio / (1 + ratio);
        var driving = elastance * litres;
        var peak = peep + driving + (resistance * litres / inspiratorySeconds);
        var mechanics = MechanicalPower.FromMechanics(
            PerMin(rate), Ml(litres * 1000), MlPerCmH2O(1000 / elastance), ratio, CmH2OSPerL(resistance), CmH2O(peep));

        Assert.Equal(expected, mechanics, 0.0051);
        Assert.Equal(expected, MechanicalPower.VolumeControlled(PerMin(rate), Ml(litres * 1000), CmH2O(peak), CmH2O(driving)), 0.0051);
    }

    [Theory, MemberData(nameof(PublishedPressureControlled))]
    public void PressureControlled_OnPublishedBreath_ReturnsPublishedPower(double rate, double litres, double above, double peep, double expected)
        => Assert.Equal(expected, MechanicalPower.PressureControlled(PerMin(rate), Ml(litres * 1000), CmH2O(above), CmH2O(peep)), 0.0051);

    /// <summary>Worked from Giosa L, et al. Intensive Care Med Exp 2019;7:61: L/min, peak, PEEP, flow L/min, J/min.</summary>
    [Theory]
    [InlineData(8.4, 30, 12, 40, 20.44)]
    [InlineData(7.5, 25, 5, 45, 14.06)]
    public void WithoutHold_OnPublishedBreath_ReturnsPublishedPower(double litresPerMinute, double peak, double peep, double flow, double expected)
        => Assert.Equal(expected, MechanicalPower.WithoutHold(LMin(litresPerMinute), CmH2O(peak), CmH2O(peep), FlowLMin(flow)), 0.0051);

    [Theory]
    [InlineData(0.05, true)]
    [InlineData(20, true)]
    [InlineData(0.049, false)]
    [InlineData(20.01, false)]
    [InlineData(double.NaN, false)]
    public void FromMechanics_AroundTheLimitsOfTheTimeRatio_RefusesOutside(double ratio, bool expected)
        => Assert.Equal(expected, Record.Exception(() => (object)Long(MlPerCmH2O(30), ratio)) is null);

    [Fact]
    public void FromMechanics_WithoutCompliance_Refuses() => Expect.Refused(() => Long(default, 0.5));

    private static double Long(Compliance compliance, double ratio)
        => MechanicalPower.FromMechanics(PerMin(20), Ml(420), compliance, ratio, CmH2OSPerL(10), CmH2O(12));
}
