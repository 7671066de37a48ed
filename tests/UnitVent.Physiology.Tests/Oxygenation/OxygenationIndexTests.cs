using static UnitVent.Physiology.Tests.Given;

namespace UnitVent.Physiology.Tests;

public sealed class OxygenationIndexTests
{
    /// <summary>Worked from the definition in DesPrez K, et al. Chest 2017;152:1151-1158.</summary>
    public static TheoryData<double, double, double, double> PublishedIndices => new()
    {
        { 0.60, 24, 75, 19.2 },
        { 0.50, 25.2, 80, 15.75 },
        { 1.0, 30, 60, 50.0 },
        { 0.40, 12, 90, 5.33 },
    };

    /// <summary>Worked from the definition in DesPrez K, et al. Chest 2017;152:1151-1158.</summary>
    public static TheoryData<double, double, double, double> PublishedSaturationIndices => new()
    {
        { 0.60, 24, 92, 15.65 },
        { 0.50, 25.2, 94, 13.40 },
        { 1.0, 30, 88, 34.09 },
    };

    [Theory, MemberData(nameof(PublishedIndices))]
    public void Compute_OnPublishedInputs_ReturnsPublishedIndex(double fiO2, double mean, double paO2, double expected)
        => Assert.Equal(expected, OxygenationIndex.Compute(FiO2(fiO2), CmH2O(mean), MmHg(paO2)), 0.005);

    [Theory, MemberData(nameof(PublishedSaturationIndices))]
    public void ComputeFromSaturation_OnPublishedInputs_ReturnsPublishedIndex(double fiO2, double mean, double spO2, double expected)
        => Assert.Equal(expected, OxygenationIndex.ComputeFromSaturation(FiO2(fiO2), CmH2O(mean), SatPercent(spO2)), 0.005);

    [Fact]
    public void Compute_WithoutAnInput_Refuses()
    {
        Expect.Refused(() => OxygenationIndex.Compute(default, CmH2O(24), MmHg(75)));
        Expect.Refused(() => OxygenationIndex.Compute(FiO2(0.6), CmH2O(24), default));
    }

    [Fact]
    public void ComputeFromSaturation_AroundTheInformativeLimit_RefusesAboveIt()
    {
        Assert.Equal(14.85, OxygenationIndex.ComputeFromSaturation(FiO2(0.6), CmH2O(24), SatPercent(97)), 0.005);
        Expect.Refused(() => OxygenationIndex.ComputeFromSaturation(FiO2(0.6), CmH2O(24), SatPercent(97.1)));
        Expect.Refused(() => OxygenationIndex.ComputeFromSaturation(default, CmH2O(24), SatPercent(92)));
    }
}
