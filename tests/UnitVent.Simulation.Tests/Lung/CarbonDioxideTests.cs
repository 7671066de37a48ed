using UnitVent.Simulation.Lung;

namespace UnitVent.Simulation.Tests.Lung;

public sealed class CarbonDioxideTests
{
    /// <summary>VA = 0.863 × VCO2 / PaCO2, an identity of respiratory physiology; rows worked by hand.</summary>
    public static TheoryData<double, double, double> WorkedBalances => new()
    {
        { 200, 4.315, 40 },
        { 250, 3.596, 60 },
        { 200, 3.452, 50 },
    };

    [Theory, MemberData(nameof(WorkedBalances))]
    public void Balance_AtWorkedValues_GivesTheTension(double outputMlMin, double alveolarLMin, double expectedMmHg) =>
        Expect.Near(expectedMmHg, CarbonDioxideStore.BalanceMmHg(outputMlMin, alveolarLMin), 0.01, "0.863 VCO2 / VA");

    [Fact]
    public void Advance_ByTheHalfTime_GoesHalfTheWay()
    {
        var (rising, falling) = (new CarbonDioxideStore(40), new CarbonDioxideStore(60));

        rising.Advance(16, 60);
        falling.Advance(3, 40);

        Expect.Near(50, rising.PaCO2MmHg, 1e-9, "rises with a half-time of 16 min");
        Expect.Near(50, falling.PaCO2MmHg, 1e-9, "falls with a half-time of 3 min");
    }

    [Fact]
    public void Advance_InOneStepOrMany_ComesToTheSame()
    {
        var (one, many) = (new CarbonDioxideStore(40), new CarbonDioxideStore(40));

        one.Advance(30, 55);
        for (var i = 0; i < 30; i++)
        {
            many.Advance(1, 55);
        }

        Expect.Near(one.PaCO2MmHg, many.PaCO2MmHg, 1e-9, "exact for constant ventilation");
    }

    [Fact]
    public void Balance_WithoutAnyVentilation_StaysFinite() => Assert.Equal(200, CarbonDioxideStore.BalanceMmHg(200, 0));
}
