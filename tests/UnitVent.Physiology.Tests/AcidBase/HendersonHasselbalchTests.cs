using CsCheck;
using static UnitVent.Physiology.Tests.Given;

namespace UnitVent.Physiology.Tests;

public sealed class HendersonHasselbalchTests
{
    /// <summary>Worked with the CLSI C46 constants, and beside them with the textbook pair 0.03 and 6.1: pH, PCO2, both bicarbonates.</summary>
    public static TheoryData<double, double, double, double> PublishedBicarbonates => new()
    {
        { 7.40, 40, 24.22, 23.94 },
        { 7.25, 60, 25.72, 25.43 },
        { 7.50, 25, 19.06, 18.84 },
        { 7.10, 90, 27.31, 27.00 },
        { 7.30, 30, 14.43, 14.26 },
        { 7.45, 55, 37.37, 36.94 },
    };

    /// <summary>Table 47-2 of a clinical anaesthesia textbook, H+ = 24 × PCO2 / HCO3: HCO3, PCO2, its pH, and ours.</summary>
    public static TheoryData<double, double, double, double> PublishedTextbookTable => new()
    {
        { 24, 40, 7.4, 7.396 },
        { 24, 60, 7.2, 7.220 },
        { 24, 20, 7.7, 7.697 },
        { 16, 40, 7.2, 7.220 },
        { 16, 60, 7.05, 7.044 },
        { 16, 20, 7.5, 7.521 },
    };

    /// <summary>Worked with the CLSI C46 constants: pH, PCO2, HCO3 as typed, and how far the computed pH is off.</summary>
    public static TheoryData<double, double, double, double, string> PublishedConsistency => new()
    {
        { 7.40, 40, 24.2, 0.000, "fits" },
        { 7.25, 60, 25.7, 0.000, "fits" },
        { 7.45, 36, 24.0, -0.008, "fits" },
        { 7.23, 60, 30.0, 0.087, "bicarbonate too high for the other two" },
        { 7.32, 48, 16.0, -0.179, "bicarbonate too low for the other two" },
    };

    [Theory, MemberData(nameof(PublishedBicarbonates))]
    public void Bicarbonate_OfPublishedGas_IsThePublishedBicarbonate(double pH, double pCO2, double expected, double textbook)
    {
        var actual = HendersonHasselbalch.Bicarbonate(Ph(pH), MmHg(pCO2));

        Assert.Equal(expected, actual, 0.0051);
        Assert.Equal(0.005, Math.Log10(actual / textbook), 0.0005);
    }

    [Theory, MemberData(nameof(PublishedTextbookTable))]
    public void PH_OfPublishedPair_IsThePublishedPH(double bicarbonate, double pCO2, double published, double ours)
    {
        var actual = HendersonHasselbalch.PH(MmolPerL(bicarbonate), MmHg(pCO2));

        Assert.Equal(published, actual, 0.025);
        Assert.Equal(ours, actual, 0.00051);
    }

    [Theory, MemberData(nameof(PublishedConsistency))]
    public void ConsistencyDeltaPH_OfPublishedGas_IsThePublishedDifference(double pH, double pCO2, double bicarbonate, double expected, string reason)
        => Expect.Near(expected, HendersonHasselbalch.ConsistencyDeltaPH(Ph(pH), MmHg(pCO2), MmolPerL(bicarbonate)), 0.00051, reason);

    [Fact]
    public void PH_OfItsOwnBicarbonate_ReturnsItself()
        => Gen.Select(Gen.Double[6.8, 7.6], Gen.Double[5, 80]).Sample((pH, pCO2) =>
            Math.Abs(HendersonHasselbalch.PH(MmolPerL(HendersonHasselbalch.Bicarbonate(Ph(pH), MmHg(pCO2))), MmHg(pCO2)) - pH) < 1e-9);

    [Fact]
    public void Equations_WithoutAnInput_Refuse()
    {
        Expect.Refused(() => HendersonHasselbalch.Bicarbonate(default, MmHg(40)));
        Expect.Refused(() => HendersonHasselbalch.Bicarbonate(Ph(7.4), default));
        Expect.Refused(() => HendersonHasselbalch.PH(default, MmHg(40)));
        Expect.Refused(() => HendersonHasselbalch.PH(MmolPerL(24), default));
        Expect.Refused(() => HendersonHasselbalch.ConsistencyDeltaPH(default, MmHg(40), MmolPerL(24)));
    }
}
