using CsCheck;
using static UnitVent.Physiology.Tests.Given;

namespace UnitVent.Physiology.Tests;

public sealed class SpO2FiO2RatioTests
{
    /// <summary>Rice TW, et al. Chest 2007;132:410-417: S/F = 64 + 0.84 × P/F, with the pairs it prints.</summary>
    public static TheoryData<double, double, double, string> PublishedLine => new()
    {
        { 148, 100, 0.05, "on the line" },
        { 190, 150, 0.05, "on the line" },
        { 232, 200, 0.05, "on the line" },
        { 316, 300, 0.05, "on the line" },
        { 235, 203.6, 0.05, "the printed cut-off, read from the line" },
        { 315, 298.8, 0.05, "the printed cut-off, read from the line" },
        { 180, 138.1, 0.05, "between" },
        { 235, 200, 4, "the rounded printed pair" },
        { 315, 300, 4, "the rounded printed pair" },
    };

    public static TheoryData<double, bool, string> Saturations => new()
    {
        { 97, true, "97 % is the last saturation of the derivation" },
        { 97.1, false, "above it the curve is flat" },
        { 100, false, "no information at all" },
        { 80, true, "weak, but the ratio is defined" },
        { 0, false, "never measured" },
        { 1e-9, true, "the lowest there is" },
    };

    [Theory, MemberData(nameof(PublishedLine))]
    public void ImputePaO2FiO2_OnPublishedRatio_ReturnsPublishedRatio(double sf, double pf, double tolerance, string reason)
        => Expect.Near(pf, SpO2FiO2Ratio.ImputePaO2FiO2(sf), tolerance, reason);

    [Theory, MemberData(nameof(Saturations))]
    public void IsInformative_AroundTheLimit_DecidesWhetherComputeRefuses(double percent, bool expected, string reason)
    {
        Assert.True(expected == SpO2FiO2Ratio.IsInformative(SatPercent(percent)), reason);
        if (expected)
        {
            Assert.Equal(percent / 0.5, SpO2FiO2Ratio.Compute(SatPercent(percent), FiO2(0.5)), 1e-9);
        }
        else
        {
            Expect.Refused(() => SpO2FiO2Ratio.Compute(SatPercent(percent), FiO2(0.5)));
        }
    }

    [Fact]
    public void Compute_WithoutOxygenFraction_Refuses() => Expect.Refused(() => SpO2FiO2Ratio.Compute(SatPercent(92), default));

    [Theory]
    [InlineData(64.1, true)]
    [InlineData(64, false)]
    [InlineData(63.9, false)]
    [InlineData(538.8, true)]
    [InlineData(97 / 0.18, true)] // the highest there is
    [InlineData(539, false)]
    [InlineData(double.NaN, false)]
    [InlineData(double.PositiveInfinity, false)]
    public void CanImpute_AroundItsLimits_DecidesWhetherImputeRefuses(double sf, bool expected)
    {
        Assert.Equal(expected, SpO2FiO2Ratio.CanImpute(sf));
        Assert.Equal(expected, Record.Exception(() => SpO2FiO2Ratio.ImputePaO2FiO2(sf)) is null);
    }

    [Fact]
    public void ImputePaO2FiO2_OfTheLinesOwnForward_ReturnsItself()
        => Gen.Double[20, 560].Sample(pf => Math.Abs(SpO2FiO2Ratio.ImputePaO2FiO2(64 + (0.84 * pf)) - pf) < 1e-9);

    [Fact]
    public void Refusals_SayWhy()
    {
        Expect.RefusedSaying("above 64 and up to 539", () => SpO2FiO2Ratio.ImputePaO2FiO2(64));
        Expect.RefusedSaying("above 0 % and up to 97 %", () => SpO2FiO2Ratio.Compute(SatPercent(98), FiO2(0.5)));
    }
}
