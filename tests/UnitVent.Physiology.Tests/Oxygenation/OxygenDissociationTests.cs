using CsCheck;
using static UnitVent.Physiology.Tests.Given;

namespace UnitVent.Physiology.Tests;

public sealed class OxygenDissociationTests
{
    /// <summary>Standard points quoted from Severinghaus JW. J Appl Physiol 1979;46:599-602, which its equation meets within 0.55 points.</summary>
    public static TheoryData<double, double> PublishedStandardPoints => new()
    {
        { 50, 85.08 },
        { 60, 90.85 },
        { 70, 94.06 },
        { 80, 95.84 },
        { 90, 96.88 },
        { 100, 97.49 },
    };

    /// <summary>Worked from equation 1 of Severinghaus JW. J Appl Physiol 1979;46:599-602.</summary>
    public static TheoryData<double, double> PublishedEquationPoints => new()
    {
        { 26.86, 50.01 },
        { 40, 74.95 },
        { 50, 84.99 },
        { 60, 90.58 },
        { 70, 93.79 },
        { 80, 95.73 },
        { 90, 96.94 },
        { 100, 97.75 },
    };

    /// <summary>Saturation; tension by the exact inverse (Ellis RK. J Appl Physiol 1989;67:902); tension by equation 2 of Severinghaus 1979.</summary>
    public static TheoryData<double, double, double> PublishedInverse => new()
    {
        { 50, 26.86, 26.83 },
        { 75, 40.04, 40.24 },
        { 88, 54.67, 54.27 },
        { 90, 58.66, 58.09 },
        { 92, 63.79, 63.06 },
        { 95, 75.67, 74.92 },
    };

    /// <summary>Worked from Kelman GR. J Appl Physiol 1966;21:1375-1376: PO2, pH, °C, PCO2, virtual PO2, saturation.</summary>
    public static TheoryData<double, double, double, double, double, double> PublishedVirtualTensions => new()
    {
        { 60, 7.25, 38.5, 60, 46.94, 82.5 },
        { 60, 7.50, 35, 30, 74.76, 94.8 },
        { 60, 7.40, 37, 40, 60, 90.58 },
    };

    [Theory, MemberData(nameof(PublishedStandardPoints))]
    public void Saturation_AtStandardPoint_IsWithinThePublishedFit(double mmHg, double percent)
        => Assert.Equal(percent, OxygenDissociation.Saturation(MmHg(mmHg)).Percent, 0.3);

    [Theory, MemberData(nameof(PublishedEquationPoints))]
    public void Saturation_AtWorkedPoint_FollowsTheEquation(double mmHg, double percent)
        => Assert.Equal(percent, OxygenDissociation.Saturation(MmHg(mmHg)).Percent, 0.0051);

    [Theory, MemberData(nameof(PublishedInverse))]
    public void PartialPressureFor_PublishedSaturation_IsThatOfEachEquation(double percent, double exact, double equation2)
    {
        var actual = OxygenDissociation.PartialPressureFor(SatPercent(percent)).MmHg;

        Assert.Equal(exact, actual, 0.0051);
        Assert.Equal(equation2, OxygenDissociation.ApproximatePartialPressureFor(SatPercent(percent)).MmHg, 0.0051);
    }

    [Theory, MemberData(nameof(PublishedVirtualTensions))]
    public void VirtualPartialPressure_OnPublishedInputs_ReturnsPublishedTension(
        double pO2, double pH, double temperatureC, double pCO2, double expected, double percent)
    {
        var actual = OxygenDissociation.VirtualPartialPressure(MmHg(pO2), Ph(pH), temperatureC, MmHg(pCO2));

        Assert.Equal(expected, actual.MmHg, 0.0051);
        Assert.Equal(percent, OxygenDissociation.Saturation(actual).Percent, 0.051);
    }

    [Fact]
    public void PartialPressureFor_TheSaturationOfATension_ReturnsTheTension()
        => Gen.Double[0.1, 700].Sample(p =>
            Math.Abs(OxygenDissociation.PartialPressureFor(OxygenDissociation.Saturation(MmHg(p))).MmHg - p) <= 1e-6 * p);

    [Fact]
    public void ApproximatePartialPressureFor_BetweenHalfAnd95Percent_IsWithinOneOfTheExact()
        => Gen.Double[50, 95].Sample(percent => Math.Abs(
            OxygenDissociation.ApproximatePartialPressureFor(SatPercent(percent)).MmHg
            - OxygenDissociation.PartialPressureFor(SatPercent(percent)).MmHg) < 1);

    [Theory]
    [InlineData(0)]
    [InlineData(100)]
    [InlineData(99.9999)]
    public void ApproximatePartialPressureFor_AnEndOfTheCurve_Refuses(double percent)
        => Expect.Refused(() => OxygenDissociation.ApproximatePartialPressureFor(SatPercent(percent)));

    /// <summary>Worked from Severinghaus JW. J Appl Physiol 1979;46:599-602: PO2, d ln PO2 / dT, d ln PO2 / d pH.</summary>
    [Theory]
    [InlineData(0, 0.071, -2.2)]
    [InlineData(26.6, 0.0709, -1.2)]
    [InlineData(100, 0.0597, -0.924)]
    [InlineData(300, 0.0162, -0.638)]
    public void Coefficients_AtWorkedTensions_FollowTheEquations(double pO2, double perDegree, double perPH)
    {
        Assert.Equal(perDegree, OxygenDissociation.TensionRisePerDegree(MmHg(pO2)), 0.000051);
        Assert.Equal(perPH, OxygenDissociation.TensionRisePerPH(MmHg(pO2)), 0.00051);
    }

    /// <summary>The temperature term of CLSI C46 is the same relation in powers of ten.</summary>
    [Fact]
    public void TensionRisePerDegree_OfAnyTension_IsThatOfTheTemperatureCorrection()
        => Gen.Double[1, 500].Sample(pO2 => Math.Abs(
            (Math.Log(TemperatureCorrection.PO2(MmHg(pO2), 38).MmHg / pO2) / OxygenDissociation.TensionRisePerDegree(MmHg(pO2))) - 1) < 0.01);

    [Fact]
    public void Saturation_OfARisingTension_NeverFalls()
        => Gen.Select(Gen.Double[0, 1000], Gen.Double[0, 1000]).Sample((a, b) =>
            OxygenDissociation.Saturation(MmHg(Math.Min(a, b))).Percent <= OxygenDissociation.Saturation(MmHg(Math.Max(a, b))).Percent);

    [Fact]
    public void Saturation_OfNoOxygen_IsZero() => Assert.Equal(0, OxygenDissociation.Saturation(MmHg(0)).Percent);

    [Theory]
    [InlineData(0)]
    [InlineData(100)]
    [InlineData(99.998)]
    public void PartialPressureFor_AnEndOfTheCurve_Refuses(double percent)
        => Expect.Refused(() => OxygenDissociation.PartialPressureFor(SatPercent(percent)));

    [Fact]
    public void PartialPressureFor_JustInsideTheEnds_ReturnsATension()
    {
        Assert.InRange(OxygenDissociation.PartialPressureFor(SatPercent(99.997)).MmHg, 900, 1000);
        Assert.InRange(OxygenDissociation.PartialPressureFor(SatPercent(0.001)).MmHg, 0, 0.01);
    }

    [Theory]
    [InlineData(25, true)]
    [InlineData(43, true)]
    [InlineData(24.9, false)]
    [InlineData(43.1, false)]
    [InlineData(double.NaN, false)]
    public void VirtualPartialPressure_AroundTheTemperatureLimits_RefusesOutside(double temperatureC, bool expected)
        => Assert.Equal(expected, Record.Exception(() => Virtual(MmHg(60), Ph(7.4), temperatureC, MmHg(40))) is null);

    [Fact]
    public void VirtualPartialPressure_WithoutAnInputOrBeyondRange_Refuses()
    {
        Expect.RefusedSaying("Parameter 'pH'", () => Virtual(MmHg(60), default, 37, MmHg(40)));
        Expect.RefusedSaying("Parameter 'pCO2'", () => Virtual(MmHg(60), Ph(7.4), 37, default));
        Expect.Refused(() => Virtual(MmHg(1000), Ph(8.0), 37, MmHg(40)));
    }

    private static PartialPressure Virtual(PartialPressure pO2, BloodPH pH, double temperatureC, PartialPressure pCO2)
        => OxygenDissociation.VirtualPartialPressure(pO2, pH, temperatureC, pCO2);
}
