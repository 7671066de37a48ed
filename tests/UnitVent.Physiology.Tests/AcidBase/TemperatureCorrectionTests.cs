using CsCheck;
using static UnitVent.Physiology.Tests.Given;

namespace UnitVent.Physiology.Tests;

public sealed class TemperatureCorrectionTests
{
    /// <summary>A laboratory trade journal of 2012, its table of factors (common practice): °C, pH shift, PCO2 and PO2 times.</summary>
    public static TheoryData<double, double, double, double> PublishedFactors => new()
    {
        { 33, 0.060, 0.850, 0.750 },
        { 35, 0.030, 0.920, 0.865 },
        { 39, -0.030, 1.080, 1.145 },
        { 40, -0.045, 1.125, 1.225 },
    };

    /// <summary>Worked from the CLSI C46 relations (from memory): pH, PCO2, PO2, °C, then the three corrected.</summary>
    public static TheoryData<double[], double, double[]> PublishedGases => new()
    {
        { [7.40, 40, 80], 33, [7.459, 33.6, 61.5] },
        { [7.40, 40, 80], 35, [7.429, 36.65, 70.2] }, // 36.649; 36.7 in print would be rounded twice
        { [7.40, 40, 80], 39, [7.371, 43.7, 91.2] },
        { [7.40, 40, 80], 40, [7.356, 45.6, 97.4] },
        { [7.25, 60, 70], 39, [7.223, 65.5, 80.2] },
        { [7.40, 40, 300], 34, [7.444, 35.1, 285.8] },
        { [7.40, 40, 80], 37, [7.40, 40, 80] },
    };

    [Theory, MemberData(nameof(PublishedFactors))]
    public void Correction_OfTheUsualGas_IsNearThePublishedFactors(double temperatureC, double shift, double pCO2, double pO2)
    {
        Assert.Equal(shift, TemperatureCorrection.PH(Ph(7.40), temperatureC).Value - 7.40, 0.002);
        Assert.Equal(1, TemperatureCorrection.PCO2(MmHg(40), temperatureC).MmHg / (40 * pCO2), 0.03);
        Assert.Equal(1, TemperatureCorrection.PO2(MmHg(80), temperatureC).MmHg / (80 * pO2), 0.03);
    }

    [Theory, MemberData(nameof(PublishedGases))]
    public void Correction_OfPublishedGas_IsAsPublished(double[] gas, double temperatureC, double[] expected)
    {
        Assert.Equal(expected[0], TemperatureCorrection.PH(Ph(gas[0]), temperatureC).Value, 0.00051);
        Assert.Equal(expected[1], TemperatureCorrection.PCO2(MmHg(gas[1]), temperatureC).MmHg, 0.051);
        Assert.Equal(expected[2], TemperatureCorrection.PO2(MmHg(gas[2]), temperatureC).MmHg, 0.051);
    }

    [Fact]
    public void Correction_ThereAndBack_ReturnsTheGas()
        => Gen.Select(Gen.Double[25, 43], Gen.Double[6.8, 7.8], Gen.Double[5, 200], Gen.Double[0, 600]).Sample((t, pH, pCO2, pO2) =>
            Math.Abs(TemperatureCorrection.PHAt37(TemperatureCorrection.PH(Ph(pH), t), t).Value - pH) < 1e-9
            && Math.Abs(TemperatureCorrection.PCO2At37(TemperatureCorrection.PCO2(MmHg(pCO2), t), t).MmHg - pCO2) < 1e-9
            && Math.Abs(TemperatureCorrection.PO2At37(TemperatureCorrection.PO2(MmHg(pO2), t), t).MmHg - pO2) < 1e-9);

    [Fact]
    public void WarmerBlood_IsMoreAcidAndHoldsHigherTensions()
        => Gen.Select(Gen.Double[25, 42], Gen.Double[0.1, 1], Gen.Double[10, 500]).Sample((t, more, tension) =>
            TemperatureCorrection.PH(Ph(7.4), t + more).Value < TemperatureCorrection.PH(Ph(7.4), t).Value
            && TemperatureCorrection.PCO2(MmHg(tension), t + more).MmHg > TemperatureCorrection.PCO2(MmHg(tension), t).MmHg
            && TemperatureCorrection.PO2(MmHg(tension), t + more).MmHg > TemperatureCorrection.PO2(MmHg(tension), t).MmHg);

    [Fact]
    public void HigherTension_StaysHigherAtAnyTemperature()
        => Gen.Select(Gen.Double[25, 43], Gen.Double[1, 500], Gen.Double[0.1, 50]).Sample((t, tension, more) =>
            TemperatureCorrection.PO2(MmHg(tension + more), t).MmHg > TemperatureCorrection.PO2(MmHg(tension), t).MmHg);

    [Theory]
    [InlineData(25, true)]
    [InlineData(43, true)]
    [InlineData(24.9, false)]
    [InlineData(43.1, false)]
    [InlineData(double.NaN, false)]
    public void Correction_AroundTheTemperatureLimits_RefusesOutside(double temperatureC, bool expected)
        => Assert.All<Func<object>>(
            [
                () => TemperatureCorrection.PH(Ph(7.4), temperatureC),
                () => TemperatureCorrection.PHAt37(Ph(7.4), temperatureC),
                () => TemperatureCorrection.PCO2(MmHg(40), temperatureC),
                () => TemperatureCorrection.PCO2At37(MmHg(40), temperatureC),
                () => TemperatureCorrection.PO2(MmHg(80), temperatureC),
                () => TemperatureCorrection.PO2At37(MmHg(80), temperatureC),
            ],
            correct => Assert.Equal(expected, Record.Exception(correct) is null));

    [Fact]
    public void Correction_BeyondWhatATypeHolds_Refuses()
    {
        Expect.RefusedSaying("Parameter 'at37'", () => TemperatureCorrection.PH(default, 37));
        Expect.RefusedSaying("Parameter 'corrected'", () => TemperatureCorrection.PHAt37(default, 37));
        Expect.Refused(() => TemperatureCorrection.PH(Ph(8.5), 25));
        Expect.Refused(() => TemperatureCorrection.PCO2(MmHg(1000), 38));
        Expect.Refused(() => TemperatureCorrection.PO2(MmHg(1000), 38));
        Expect.Refused(() => TemperatureCorrection.PO2At37(MmHg(1000), 30));
    }
}
