using UnitVent.Simulation.Lung;

namespace UnitVent.Simulation.Tests.Lung;

public sealed class MetabolicStateTests
{
    /// <summary>Standard base excess of the CLSI form, 24.8 as reference bicarbonate and 16.2 as buffer, worked by hand for five gases.</summary>
    public static TheoryData<double, double, double> WorkedGases => new()
    {
        { 7.40, 40, -0.58 },
        { 7.25, 60, -1.51 },
        { 7.20, 30, -16.58 },
        { 7.50, 45, 11.12 },
        { 7.10, 80, -5.38 },
    };

    [Theory, MemberData(nameof(WorkedGases))]
    public void PH_FromTensionAndBaseExcess_IsThatOfTheGas(double expectedPH, double paCO2MmHg, double standardBaseExcess) =>
        Expect.Near(expectedPH, MetabolicState.PH(paCO2MmHg, standardBaseExcess), 0.0002, "the inverse of the equation");

    [Fact]
    public void PH_AsCarbonDioxideRises_Falls() => Assert.True(MetabolicState.PH(60, 0) < MetabolicState.PH(40, 0));
}
