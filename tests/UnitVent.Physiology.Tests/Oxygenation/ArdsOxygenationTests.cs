using System.Runtime.CompilerServices;
using static UnitVent.Physiology.OxygenationClass;
using static UnitVent.Physiology.Tests.Given;

namespace UnitVent.Physiology.Tests;

public sealed class ArdsOxygenationTests
{
    /// <summary>ARDS Definition Task Force, JAMA 2012;307:2526-2533, oxygenation row of the table: P/F, PEEP.</summary>
    public static TheoryData<double, double, OxygenationClass, string> PublishedBerlin => new()
    {
        { 301, 5, AboveMild, "above the definition" },
        { 300.1, 5, AboveMild, "just above the definition" },
        { 300, 5, Mild, "300 itself is mild" },
        { 201, 5, Mild, "mild" },
        { 200.1, 5, Mild, "mild lies strictly above 200" },
        { 200, 5, Moderate, "200 itself is moderate" },
        { 101, 5, Moderate, "moderate" },
        { 100.1, 5, Moderate, "moderate lies strictly above 100" },
        { 100, 5, Severe, "100 itself is severe" },
        { 0, 5, Severe, "no oxygen at all" },
        { 150, 3, NotClassified, "too little pressure" },
        { 150, 4.9, NotClassified, "every range asks for at least 5 cmH2O" },
        { 150, 25, Moderate, "a mean pressure in APRV" },
    };

    /// <summary>Matthay MA, et al. Am J Respir Crit Care Med 2024;209:37-47, through a summary: SpO2, FiO2, PEEP.</summary>
    public static TheoryData<double, double, double, OxygenationClass, string> PublishedSaturations => new()
    {
        { 94.5, 0.30, 5, Mild, "S/F 315" },
        { 94.8, 0.30, 5, AboveMild, "S/F 316" },
        { 94.4, 0.40, 5, Mild, "S/F 236" },
        { 94.0, 0.40, 5, Moderate, "S/F 235" },
        { 89.4, 0.60, 5, Moderate, "S/F 149" },
        { 88.8, 0.60, 5, Severe, "S/F 148" },
        { 97.0, 0.50, 5, Moderate, "97 % is still classified" },
        { 98.0, 0.50, 5, NotClassified, "above 97 % nothing is" },
        { 88.8, 0.60, 4.9, NotClassified, "too little pressure" },
    };

    /// <summary>At 630 mmHg the mild limit is 300 × 630 / 760 = 248.7 (computed); the ratio way is that of JAMA 2012;307:2526-2533.</summary>
    public static TheoryData<double, double, AltitudeScaling, OxygenationClass, string> PublishedAltitudes => new()
    {
        { 248.6, 630, AltitudeScaling.Limits, Mild, "just under the scaled limit" },
        { 248.7, 630, AltitudeScaling.Limits, AboveMild, "248.7 is 248.68 rounded up, so just above it" },
        { 165.7, 630, AltitudeScaling.Limits, Moderate, "just under 165.8" },
        { 165.9, 630, AltitudeScaling.Limits, Mild, "just above 165.8" },
        { 82.8, 630, AltitudeScaling.Limits, Severe, "just under 82.9" },
        { 83.0, 630, AltitudeScaling.Limits, Moderate, "just above 82.9" },
        { 361.9, 630, AltitudeScaling.Ratio, Mild, "times 630 / 760 just under 300" },
        { 362.0, 630, AltitudeScaling.Ratio, AboveMild, "times 630 / 760 just above 300" },
        { 241, 630, AltitudeScaling.Ratio, Moderate, "the same gas reads worse than by limits" },
        { 241, 630, AltitudeScaling.Limits, Mild, "the same gas reads better than by ratio" },
        { 300, 674.2, AltitudeScaling.Limits, Mild, "under 1000 m nothing is scaled" },
        { 300, 674.0, AltitudeScaling.Limits, AboveMild, "above 1000 m the limit is" },
        { 338, 674.0, AltitudeScaling.Ratio, Mild, "above 1000 m the ratio is" },
        { 338, 674.2, AltitudeScaling.Ratio, AboveMild, "under 1000 m the ratio is not" },
        { 300, 790, AltitudeScaling.Limits, Mild, "high pressure at sea level changes nothing" },
    };

    [Theory, MemberData(nameof(PublishedBerlin))]
    public void FromPaO2_AtPublishedBoundary_ReturnsPublishedRange(double pf, double pressure, OxygenationClass expected, string reason)
    {
        Assert.True(expected == Berlin(pf, pressure, 760, AltitudeScaling.Limits), reason);
        Assert.True(expected == Berlin(pf, pressure, 760, AltitudeScaling.Ratio), reason);
    }

    [Theory, MemberData(nameof(PublishedSaturations))]
    public void FromSpO2_AtPublishedBoundary_ReturnsPublishedRange(double spO2, double fiO2, double pressure, OxygenationClass expected, string reason)
        => Assert.True(expected == ArdsOxygenation.FromSpO2(SatPercent(spO2), FiO2(fiO2), CmH2O(pressure)), reason);

    [Theory, MemberData(nameof(PublishedAltitudes))]
    public void FromPaO2_InTheMountains_ScalesWhatItIsTold(
        double pf, double barometric, AltitudeScaling scaling, OxygenationClass expected, string reason)
        => Assert.True(expected == Berlin(pf, 5, barometric, scaling), reason);

    [Fact]
    public void FromPaO2_At1000MetresItself_ScalesNothing()
        => Assert.Equal(Mild, Berlin(300, 5, BarometricPressure.FromAltitude(1000).MmHg, AltitudeScaling.Limits));

    [Theory]
    [InlineData(-0.1)]
    [InlineData(6000.1)]
    [InlineData(double.NaN)]
    public void FromPaO2_OfAnImpossibleRatio_Refuses(double pf) => Expect.Refused(() => Berlin(pf, 5, 760, AltitudeScaling.Limits));

    [Fact]
    public void FromPaO2_OfTheHighestRatio_IsClassified() => Assert.Equal(AboveMild, Berlin(6000, 5, 760, AltitudeScaling.Limits));

    [Fact]
    public void Classification_WithoutAnInput_Refuses()
    {
        Expect.Refused(() => ArdsOxygenation.FromPaO2(150, CmH2O(5), default, AltitudeScaling.Limits));
        Expect.Refused(() => ArdsOxygenation.FromSpO2(SatPercent(92), default, CmH2O(5)));
        Expect.Refused(() => ArdsOxygenation.FromSpO2(SatPercent(99), default, CmH2O(5)));
    }

    [Fact]
    public void FromPaO2_ByAScalingThatDoesNotExist_Throws()
        => Assert.Throws<SwitchExpressionException>(() => Berlin(150, 5, 760, (AltitudeScaling)9));

    private static OxygenationClass Berlin(double pf, double pressure, double barometric, AltitudeScaling scaling)
        => ArdsOxygenation.FromPaO2(pf, CmH2O(pressure), BarometricPressure.FromMmHg(barometric), scaling);
}
