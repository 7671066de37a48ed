using static UnitVent.Physiology.Tests.Given;

namespace UnitVent.Physiology.Tests;

public sealed class PaO2FiO2RatioTests
{
    /// <summary>Worked from the definition in JAMA 2012;307:2526-2533.</summary>
    public static TheoryData<double, double, double> PublishedRatios => new()
    {
        { 80, 0.40, 200 },
        { 63, 0.90, 70 },
        { 95, 0.21, 452 },
        { 80, 1.00, 80 },
    };

    [Theory, MemberData(nameof(PublishedRatios))]
    public void Compute_OnPublishedPair_ReturnsPublishedRatio(double paO2, double fiO2, double expected)
        => Assert.Equal(expected, PaO2FiO2Ratio.Compute(MmHg(paO2), FiO2(fiO2)), 0.5);

    [Fact]
    public void Compute_OnATensionInKilopascals_ReturnsMmHg()
        => Assert.Equal(157.5, PaO2FiO2Ratio.Compute(PartialPressure.FromKilopascals(10.5), FiO2(0.50)), 0.05);

    [Fact]
    public void Compute_WithoutAnInput_Refuses()
    {
        Expect.Refused(() => PaO2FiO2Ratio.Compute(default, FiO2(0.5)));
        Expect.Refused(() => PaO2FiO2Ratio.Compute(MmHg(80), default));
    }
}
