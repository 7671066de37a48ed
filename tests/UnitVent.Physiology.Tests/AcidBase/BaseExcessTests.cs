using CsCheck;
using static UnitVent.Physiology.Tests.Given;

namespace UnitVent.Physiology.Tests;

public sealed class BaseExcessTests
{
    /// <summary>pH, PCO2, Hb, then BE(B) and SBE after CLSI C46, standard bicarbonate at sO2 97 % (an analyser's reference manual, from memory).</summary>
    public static TheoryData<double, double, double, double, double, double> PublishedGases => new()
    {
        { 7.40, 40, 15, -0.46, -0.58, 24.01 },
        { 7.25, 60, 10, -2.05, -1.51, 22.68 },
        { 7.20, 30, 10, -15.25, -16.58, 12.78 },
        { 7.50, 45, 12, 9.98, 11.12, 33.71 },
        { 7.10, 80, 9, -5.85, -5.38, 19.57 },
    };

    /// <summary>The same gases worked by other forms: Lang W, Zander R. Clin Chem Lab Med 2002;40:404-410 at full saturation, and
    /// Siggaard-Andersen O. Scand J Clin Lab Invest Suppl 1977;146:15-20 (from memory).</summary>
    public static TheoryData<double, double, double, double, double> PublishedOtherForms => new()
    {
        { 7.40, 40, 15, 0.00, -0.17 },
        { 7.25, 60, 10, -2.03, -0.84 },
        { 7.20, 30, 10, -15.37, -14.77 },
        { 7.50, 45, 12, 10.78, 10.58 },
        { 7.10, 80, 9, -6.27, -4.24 },
    };

    [Theory, MemberData(nameof(PublishedGases))]
    public void BaseExcess_OfPublishedGas_IsAsPublished(double pH, double pCO2, double hb, double blood, double standard, double standardBicarbonate)
    {
        var bicarbonate = HendersonHasselbalch.Bicarbonate(Ph(pH), MmHg(pCO2));
        var actual = BaseExcess.Blood(Ph(pH), bicarbonate, GPerDl(hb));

        Assert.Equal(blood, actual, 0.0051);
        Assert.Equal(standard, BaseExcess.Standard(Ph(pH), bicarbonate), 0.0051);
        Assert.Equal(standardBicarbonate, StandardBicarbonate.Compute(actual, GPerDl(hb), SatPercent(97)), 0.0051);
    }

    [Theory, MemberData(nameof(PublishedOtherForms))]
    public void BaseExcess_ByOtherPublishedForms_IsAsPublishedAndDiffersByLessThanTwo(double pH, double pCO2, double hb, double zander, double vanSlyke)
    {
        var bicarbonate = HendersonHasselbalch.Bicarbonate(Ph(pH), MmHg(pCO2));

        Assert.Equal(zander, BaseExcess.Zander(Ph(pH), MmHg(pCO2), GPerDl(hb), SatPercent(100)), 0.0051);
        Assert.Equal(vanSlyke, BaseExcess.StandardVanSlyke(Ph(pH), bicarbonate), 0.0051);
        Assert.Equal(zander, BaseExcess.Blood(Ph(pH), bicarbonate, GPerDl(hb)), 2.0);
        Assert.Equal(vanSlyke, BaseExcess.Standard(Ph(pH), bicarbonate), 2.0);
    }

    [Theory]
    [InlineData(-0.1)]
    [InlineData(1000.1)]
    [InlineData(double.NaN)]
    public void BaseExcess_OfAnImpossibleBicarbonate_Refuses(double bicarbonate)
    {
        Expect.Refused(() => BaseExcess.Blood(Ph(7.4), bicarbonate, GPerDl(10)));
        Expect.Refused(() => BaseExcess.Standard(Ph(7.4), bicarbonate));
    }

    [Fact]
    public void BaseExcess_AtTheBicarbonateLimits_IsComputed()
    {
        Assert.Equal(-24.8, BaseExcess.Standard(Ph(7.4), 0), 1e-9);
        Assert.Equal(975.2, BaseExcess.Standard(Ph(7.4), 1000), 1e-9);
    }

    /// <summary>Lang and Zander: each g/dL of haemoglobin that carries no oxygen takes up 0.2 mmol/L.</summary>
    [Fact]
    public void Zander_OfBloodWithoutOxygen_IsLowerByItsHaemoglobin()
        => Assert.Equal(-0.2 * 15 * 0.25, Zander(75) - Zander(100), 1e-9);

    [Fact]
    public void Zander_WithoutAnInput_Refuses()
    {
        Expect.Refused(() => BaseExcess.Zander(default, MmHg(40), GPerDl(15), SatPercent(97)));
        Expect.Refused(() => BaseExcess.Zander(Ph(7.4), default, GPerDl(15), SatPercent(97)));
        Expect.Refused(() => BaseExcess.StandardVanSlyke(default, 24));
        Expect.Refused(() => BaseExcess.StandardVanSlyke(Ph(7.4), double.NaN));
    }

    [Fact]
    public void BaseExcess_OfARisingPCO2AtOnePH_Rises()
        => Gen.Select(Gen.Double[6.9, 7.7], Gen.Double[10, 100], Gen.Double[1, 20]).Sample((pH, pCO2, more) =>
            BaseExcess.Zander(Ph(pH), MmHg(pCO2 + more), GPerDl(10), SatPercent(97)) > BaseExcess.Zander(Ph(pH), MmHg(pCO2), GPerDl(10), SatPercent(97)));

    [Fact]
    public void BaseExcess_WithoutPH_Refuses() => Expect.Refused(() => BaseExcess.Standard(default, 24));

    [Theory]
    [InlineData(-1000.1)]
    [InlineData(1000.1)]
    [InlineData(double.NaN)]
    public void StandardBicarbonate_OfAnImpossibleBaseExcess_Refuses(double baseExcess)
        => Expect.Refused(() => StandardBicarbonate.Compute(baseExcess, GPerDl(10), SatPercent(97)));

    [Fact]
    public void StandardBicarbonate_OfBloodInBalance_IsTheReference()
        => Assert.Equal(24.47, StandardBicarbonate.Compute(0, GPerDl(15), SatPercent(100)), 1e-9);

    private static double Zander(double percent) => BaseExcess.Zander(Ph(7.25), MmHg(60), GPerDl(15), SatPercent(percent));
}
