using static UnitVent.Physiology.Tests.Given;

namespace UnitVent.Physiology.Tests;

public sealed class StaticMechanicsTests
{
    /// <summary>Worked from the definition in Amato MBP, et al. N Engl J Med 2015;372:747-755: VT, plateau, PEEP, driving, C.</summary>
    public static TheoryData<double, double, double, double, double> PublishedBreaths => new()
    {
        { 420, 26, 12, 14, 30.0 },
        { 450, 30, 10, 20, 22.5 },
        { 360, 24, 10, 14, 25.7 },
    };

    [Theory, MemberData(nameof(PublishedBreaths))]
    public void Mechanics_OfPublishedBreath_AreAsPublished(double tidal, double plateau, double peep, double driving, double compliance)
    {
        Assert.Equal(driving, StaticMechanics.DrivingPressure(CmH2O(plateau), CmH2O(peep)).CmH2O, 1e-9);
        Assert.Equal(compliance, StaticMechanics.StaticCompliance(Ml(tidal), CmH2O(plateau), CmH2O(peep)).MlPerCmH2O, 0.051);
    }

    [Theory]
    [InlineData(420, 10.85, 10, true)] // 494 mL/cmH2O
    [InlineData(500, 11, 10, true)] // 500 mL/cmH2O itself
    [InlineData(420, 10.83, 10, false)] // 506 mL/cmH2O
    [InlineData(420, 10, 10, false)]
    [InlineData(420, 9.9, 10, false)]
    [InlineData(0, 26, 12, false)]
    public void IsDefined_AroundItsLimits_DecidesWhetherComplianceRefuses(double tidal, double plateau, double peep, bool expected)
    {
        Assert.Equal(expected, StaticMechanics.IsDefined(Ml(tidal), CmH2O(plateau), CmH2O(peep)));
        Assert.Equal(expected, Record.Exception(() => StaticMechanics.StaticCompliance(Ml(tidal), CmH2O(plateau), CmH2O(peep))) is null);
    }

    [Fact]
    public void DrivingPressure_OfAPlateauNotAbovePeep_Refuses()
        => Expect.Refused(() => StaticMechanics.DrivingPressure(CmH2O(10), CmH2O(10)));
}
