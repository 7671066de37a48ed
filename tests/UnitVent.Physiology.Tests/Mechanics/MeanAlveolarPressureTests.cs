using CsCheck;
using static UnitVent.Physiology.Tests.Given;

namespace UnitVent.Physiology.Tests;

public sealed class MeanAlveolarPressureTests
{
    /// <summary>Worked from Marini JJ, Ravenscraft SA. Crit Care Med 1992;20:1461-1472: mean, VE, RE, RI, alveolar mean.</summary>
    public static TheoryData<double, double, double, double, double> PublishedMeans => new()
    {
        { 25.2, 5.04, 12, 8, 25.54 },
        { 25.2, 5.0, 15, 5, 26.03 },
    };

    [Theory, MemberData(nameof(PublishedMeans))]
    public void Compute_OnPublishedInputs_ReturnsPublishedMean(double mean, double ventilation, double expiratory, double inspiratory, double expected)
        => Assert.Equal(expected, Compute(mean, ventilation, expiratory, inspiratory), 0.0051);

    [Fact]
    public void Compute_WithEqualResistances_IsTheAirwayMean()
        => Gen.Select(Gen.Double[0, 40], Gen.Double[0, 100]).Sample((ventilation, r) => Compute(25.2, ventilation, r, r) == 25.2);

    [Fact]
    public void Compute_BeyondAnAirwayPressure_Refuses() => Expect.Refused(() => Compute(140, 60, 11, 0));

    private static double Compute(double mean, double ventilation, double expiratory, double inspiratory)
        => MeanAlveolarPressure.Compute(CmH2O(mean), LMin(ventilation), CmH2OSPerL(expiratory), CmH2OSPerL(inspiratory)).CmH2O;
}
