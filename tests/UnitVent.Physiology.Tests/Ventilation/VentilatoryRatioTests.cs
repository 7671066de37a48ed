using static UnitVent.Physiology.Tests.Given;

namespace UnitVent.Physiology.Tests;

public sealed class VentilatoryRatioTests
{
    /// <summary>Worked from Sinha P, et al. Am J Respir Crit Care Med 2019;199:333-341: VE, PaCO2, PBW, ratio.</summary>
    public static TheoryData<double, double, double, double> PublishedRatios => new()
    {
        { 7.0, 37.5, 70, 1.00 },
        { 10, 50, 70, 1.90 },
        { 9.5, 44, 60, 1.86 },
        { 12, 60, 65, 2.95 },
    };

    [Theory, MemberData(nameof(PublishedRatios))]
    public void Compute_OnPublishedInputs_ReturnsPublishedRatio(double litresPerMinute, double paCO2, double kilograms, double expected)
        => Assert.Equal(expected, VentilatoryRatio.Compute(LMin(litresPerMinute), MmHg(paCO2), Kg(kilograms)), 0.0051);

    /// <summary>The form of Sinha P, et al. Crit Care 2013;17:R34, predicts 5 kPa.</summary>
    [Fact]
    public void Compute_AtThePredictedTensionInKilopascals_IsOne()
        => Assert.Equal(1, VentilatoryRatio.Compute(LMin(7), PartialPressure.FromKilopascals(5), Kg(70)), 0.001);

    [Fact]
    public void Compute_WithoutBodyMass_Refuses() => Expect.Refused(() => VentilatoryRatio.Compute(LMin(7), MmHg(40), default));
}
