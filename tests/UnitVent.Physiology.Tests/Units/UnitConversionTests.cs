using CsCheck;
using static UnitVent.Physiology.Tests.Given;

namespace UnitVent.Physiology.Tests;

public sealed class UnitConversionTests
{
    /// <summary>NIST SP 811 (2008), appendix B.8: the standard atmosphere is 101 325 Pa, and 760 mmHg.</summary>
    public static TheoryData<double, double, double, string> PublishedTensions => new()
    {
        { 5.3, 39.75, 0.005, "a usual PaCO2" },
        { 8.0, 60.0, 0.05, "a low PaO2" },
        { 13.3, 99.8, 0.05, "a usual PaO2" },
        { 5.333, 40, 0.005, "40 mmHg printed in kPa" },
        { 101.325, 760, 1e-9, "the standard atmosphere itself" },
        { 1, 7.500617, 5e-7, "the factor as printed" },
        { 0.1333224, 1, 5e-7, "its reciprocal as printed" },
        { 40.0, 300, 0.05, "P/F 300" },
        { 26.7, 200, 0.5, "P/F 200" },
        { 20.0, 150, 0.05, "P/F 150" },
        { 13.3, 100, 0.5, "P/F 100" },
    };

    /// <summary>NIST SP 811 (2008), appendix B.8: conventional centimetre of water, 98.0665 Pa.</summary>
    public static TheoryData<double, double> PublishedAirwayPressures => new()
    {
        { 29.41995, 30 },
        { 0.980665, 1 },
        { 9.80665, 10 },
    };

    [Theory, MemberData(nameof(PublishedTensions))]
    public void PartialPressure_FromKilopascals_HasThePublishedMmHg(double kilopascals, double mmHg, double tolerance, string reason)
        => Expect.Near(mmHg, PartialPressure.FromKilopascals(kilopascals).MmHg, tolerance, reason);

    [Theory, MemberData(nameof(PublishedAirwayPressures))]
    public void AirwayPressure_FromHectopascals_HasThePublishedCmH2O(double hectopascals, double cmH2O)
        => Assert.Equal(cmH2O, AirwayPressure.FromHectopascals(hectopascals).CmH2O, 1e-9);

    [Fact]
    public void WaterAndMercury_OfOnePressure_AgreeThroughPascals()
    {
        var mercury = MmHg(7.355592);

        Assert.Equal(10, AirwayPressure.FromHectopascals(mercury.Kilopascals * 10).CmH2O, 1e-5);
    }

    [Fact]
    public void PartialPressure_ToKilopascalsAndBack_ReturnsItself()
        => Gen.Double[0, 999].Sample(x => Math.Abs(PartialPressure.FromKilopascals(MmHg(x).Kilopascals).MmHg - x) <= 1e-12 * x);

    [Fact]
    public void Results_OfConvertedInputs_AreThoseOfTheUnconverted()
        => Gen.Select(Gen.Double[30, 150], Gen.Double[40, 600], Gen.Double[15, 40], Gen.Double[0, 10]).Sample((tension, oxygen, high, low) =>
            Near(PaO2FiO2Ratio.Compute(MmHg(oxygen), FiO2(0.5)), PaO2FiO2Ratio.Compute(PartialPressure.FromKilopascals(MmHg(oxygen).Kilopascals), FiO2(0.5)))
            && Near(Ratio(MmHg(tension)), Ratio(PartialPressure.FromKilopascals(tension * 101.325 / 760)))
            && Near(Mean(CmH2O(high), CmH2O(low)), Mean(AirwayPressure.FromHectopascals(high * 0.980665), AirwayPressure.FromHectopascals(low * 0.980665))));

    [Fact]
    public void SmallerUnits_AreThousandths()
    {
        Assert.Equal(0.42, Ml(420).Litres, 1e-12);
        Assert.Equal(7500, LMin(7.5).MillilitresPerMinute, 1e-9);
        Assert.Equal(0.975, SatPercent(97.5).Fraction, 1e-12);
    }

    private static double Ratio(PartialPressure paCO2) => VentilatoryRatio.Compute(LMin(8), paCO2, Kg(60));

    private static double Mean(AirwayPressure high, AirwayPressure low) => MeanAirwayPressure.Aprv(high, low, Seconds(5), Seconds(0.5)).CmH2O;

    private static bool Near(double expected, double actual) => Math.Abs(expected - actual) <= 1e-12 * expected;
}
