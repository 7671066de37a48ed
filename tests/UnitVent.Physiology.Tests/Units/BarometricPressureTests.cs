using CsCheck;

namespace UnitVent.Physiology.Tests;

public sealed class BarometricPressureTests
{
    /// <summary>ISO 2533:1975, standard atmosphere.</summary>
    public static TheoryData<double, double, string> PublishedAltitudes => new()
    {
        { 0, 760.0, "sea level" },
        { 1500, 634.2, "845.6 hPa" },
        { 2600, 553.2, "a high capital" },
        { 3000, 525.9, "701.1 hPa" },
    };

    [Theory, MemberData(nameof(PublishedAltitudes))]
    public void FromAltitude_AtPublishedHeight_HasThePublishedPressure(double metres, double mmHg, string reason)
        => Expect.Near(mmHg, BarometricPressure.FromAltitude(metres).MmHg, 0.05, reason);

    /// <summary>Worked from West JB. J Appl Physiol 1996;81:1850-1854, coefficients from memory; the summit was measured at about 253 mmHg.</summary>
    public static TheoryData<double, double, string> PublishedInhabitedAltitudes => new()
    {
        { 0, 759.5, "sea level" },
        { 1500, 640.7, "6.5 above the standard atmosphere" },
        { 3000, 536.8, "11 above the standard atmosphere" },
        { 8848, 252.7, "the highest summit" },
    };

    [Theory, MemberData(nameof(PublishedInhabitedAltitudes))]
    public void FromInhabitedAltitude_AtPublishedHeight_HasThePublishedPressure(double metres, double mmHg, string reason)
        => Expect.Near(mmHg, BarometricPressure.FromInhabitedAltitude(metres).MmHg, 0.051, reason);

    [Fact]
    public void FromInhabitedAltitude_AtEachLimit_AcceptsInsideAndRefusesOutside()
    {
        Assert.InRange(BarometricPressure.FromInhabitedAltitude(9000).MmHg, 240, 252);
        Expect.Refused(() => BarometricPressure.FromInhabitedAltitude(-0.1));
        Expect.Refused(() => BarometricPressure.FromInhabitedAltitude(9000.1));
        Expect.Refused(() => BarometricPressure.FromInhabitedAltitude(double.NaN));
    }

    /// <summary>4–13 mmHg above the standard atmosphere, as is commonly said, holds from 1 to 4 km (computed).</summary>
    [Fact]
    public void FromInhabitedAltitude_WherePeopleLive_IsAboveTheStandardAtmosphere()
        => Gen.Double[1000, 4000].Sample(metres => BarometricPressure.FromInhabitedAltitude(metres).MmHg
            - BarometricPressure.FromAltitude(metres).MmHg is > 4 and < 13.1);

    [Fact]
    public void Pressure_OfAHigherPlace_IsLower()
        => Gen.Select(Gen.Double[0, 8900], Gen.Double[1, 100]).Sample((metres, climb) =>
            BarometricPressure.FromAltitude(metres + climb).MmHg < BarometricPressure.FromAltitude(metres).MmHg
            && BarometricPressure.FromInhabitedAltitude(metres + climb).MmHg < BarometricPressure.FromInhabitedAltitude(metres).MmHg);

    [Fact]
    public void FromAltitude_AtEachLimit_AcceptsInsideAndRefusesOutside()
    {
        Assert.InRange(BarometricPressure.FromAltitude(-500).MmHg, 760, 900);
        Assert.InRange(BarometricPressure.FromAltitude(9000).MmHg, 200, 300);
        Expect.Refused(() => BarometricPressure.FromAltitude(-500.1));
        Expect.Refused(() => BarometricPressure.FromAltitude(9000.1));
        Expect.Refused(() => BarometricPressure.FromAltitude(double.NaN));
    }
}
