using CsCheck;
using static UnitVent.Physiology.Tests.Given;

namespace UnitVent.Physiology.Tests;

public sealed class HydrogenIonTests
{
    /// <summary>pH and hydrogen ion concentration in nmol/L as commonly tabled (common practice).</summary>
    public static TheoryData<double, double> PublishedTable => new()
    {
        { 7.00, 100 },
        { 7.10, 79 },
        { 7.20, 63 },
        { 7.30, 50 },
        { 7.40, 40 },
        { 7.50, 32 },
        { 7.60, 25 },
    };

    /// <summary>Table 47-2 of a clinical anaesthesia textbook: HCO3, PCO2, H+, pH. It prints pH to about 0.05.</summary>
    public static TheoryData<double, double, double, double> PublishedTextbookTable => new()
    {
        { 24, 40, 40, 7.4 },
        { 24, 60, 60, 7.2 },
        { 24, 20, 20, 7.7 },
        { 16, 40, 60, 7.2 },
        { 16, 60, 90, 7.05 },
        { 16, 20, 30, 7.5 },
    };

    [Theory, MemberData(nameof(PublishedTable))]
    public void NmolPerLitre_OfTabledPH_IsAsTabled(double pH, double expected)
    {
        Assert.Equal(expected, HydrogenIon.NmolPerLitre(Ph(pH)), 0.51);
        Assert.Equal(pH, HydrogenIon.PH(expected).Value, 0.01);
    }

    [Theory, MemberData(nameof(PublishedTextbookTable))]
    public void RuleOfThumb_OfPublishedPair_IsThePublishedConcentration(double bicarbonate, double pCO2, double hydrogen, double pH)
    {
        var actual = HydrogenIon.RuleOfThumbNmolPerLitre(MmHg(pCO2), MmolPerL(bicarbonate));

        Assert.Equal(hydrogen, actual, 1e-9);
        Assert.Equal(pH, HydrogenIon.PH(actual).Value, 0.025);
    }

    [Fact]
    public void RuleOfThumb_BesideHendersonHasselbalch_Reads4PerThousandLow()
        => Gen.Select(Gen.Double[10, 100], Gen.Double[5, 45]).Sample((pCO2, bicarbonate) =>
        {
            var exact = Math.Pow(10, 9 - HendersonHasselbalch.PH(MmolPerL(bicarbonate), MmHg(pCO2)));
            return Math.Abs((HydrogenIon.RuleOfThumbNmolPerLitre(MmHg(pCO2), MmolPerL(bicarbonate)) / exact) - 0.9956) < 0.0001;
        });

    [Fact]
    public void PH_OfItsOwnConcentration_ReturnsItself()
        => Gen.Double[6.0001, 8.4999].Sample(pH => Math.Abs(HydrogenIon.PH(HydrogenIon.NmolPerLitre(Ph(pH))).Value - pH) < 1e-9);

    [Fact]
    public void Concentration_OfAHigherPH_IsLower()
        => Gen.Select(Gen.Double[6, 8.4], Gen.Double[0.001, 0.1]).Sample((pH, more) =>
            HydrogenIon.NmolPerLitre(Ph(pH + more)) < HydrogenIon.NmolPerLitre(Ph(pH)));

    [Theory]
    [InlineData(3.16)] // pH 8.5003
    [InlineData(1001)] // pH 5.9996
    [InlineData(0)]
    [InlineData(-40)]
    [InlineData(double.NaN)]
    [InlineData(double.PositiveInfinity)]
    public void PH_OfAnImpossibleConcentration_Refuses(double nmolPerLitre) => Expect.Refused(() => HydrogenIon.PH(nmolPerLitre));

    [Fact]
    public void Equations_WithoutAnInput_Refuse()
    {
        Expect.Refused(() => HydrogenIon.NmolPerLitre(default));
        Expect.Refused(() => HydrogenIon.RuleOfThumbNmolPerLitre(default, MmolPerL(24)));
        Expect.Refused(() => HydrogenIon.RuleOfThumbNmolPerLitre(MmHg(40), default));
    }
}
