using CsCheck;
using static UnitVent.Physiology.Tests.Given;

namespace UnitVent.Physiology.Tests;

public sealed class IncompleteRefillingTests
{
    /// <summary>Worked from Burke WC, et al. J Appl Physiol 1993;74:922-933: C, step, T high, T low, both tau, volume, trapped.</summary>
    public static TheoryData<double, double, double, double, double, double, double, double> PublishedStates => new()
    {
        { 30, 30, 4.0, 0.5, 1.0, 1.0, 351.5, 18.06 },
        { 40, 25, 2.0, 0.5, 1.0, 0.8, 433.2, 12.47 },
        { 50, 20, 1.5, 1.0, 1.5, 1.5, 379.2, 8.00 },
    };

    [Theory, MemberData(nameof(PublishedStates))]
    public void State_OnPublishedSettings_IsAsPublished(
        double compliance, double step, double timeHigh, double timeLow, double tauI, double tauE, double volume, double trapped)
    {
        Assert.Equal(volume, Volume(compliance, step, timeHigh, timeLow, tauI, tauE), 0.051);
        Assert.Equal(trapped, Trapped(step, timeHigh, timeLow, tauI, tauE), 0.0051);
    }

    /// <summary>The simple form gives 354.1 mL for the first published state; with a long T high the general form meets it.</summary>
    [Fact]
    public void ReleaseVolume_WithALongTimeHigh_IsTheSimpleForm()
    {
        Assert.Equal(354.1, 30 * 30 * (1 - Math.Exp(-0.5)), 0.051);
        Assert.Equal(354.1, Volume(30, 30, 20, 0.5, 1, 1), 0.051);
    }

    [Fact]
    public void VolumeOverCompliance_PlusTrapped_NeverExceedsTheStep()
        => Gen.Select(Gen.Double[1, 50], Gen.Double[0.1, 30], Gen.Double[0.05, 5], Gen.Double[0.1, 5]).Sample((step, timeHigh, timeLow, tau) =>
            (Volume(10, step, timeHigh, timeLow, tau, tau) / 10) + Trapped(step, timeHigh, timeLow, tau, tau) <= step + 1e-9);

    [Theory]
    [InlineData(3.99, 1, true)]
    [InlineData(4, 1, false)]
    [InlineData(7.99, 2, true)]
    [InlineData(8, 2, false)]
    public void Needed_AroundFourTimeConstants_IsTrueBelow(double timeHigh, double tau, bool expected)
        => Assert.Equal(expected, IncompleteRefilling.Needed(Seconds(timeHigh), Seconds(tau)));

    [Theory]
    [InlineData(0, 4, 0.5, 1, 1)]
    [InlineData(20, 0, 0.5, 1, 1)]
    [InlineData(20, 4, 0, 1, 1)]
    [InlineData(20, 4, 0.5, 0, 1)]
    [InlineData(20, 4, 0.5, 1, 0)]
    public void State_WithoutAStepOrATime_IsRefused(double step, double timeHigh, double timeLow, double tauI, double tauE)
    {
        Expect.Refused(() => Volume(30, step, timeHigh, timeLow, tauI, tauE));
        Expect.Refused(() => Trapped(step, timeHigh, timeLow, tauI, tauE));
    }

    [Fact]
    public void ReleaseVolume_WithoutCompliance_Refuses()
        => Expect.Refused(() => IncompleteRefilling.ReleaseVolume(default, CmH2O(28), CmH2O(0), Seconds(4), Seconds(0.5), Seconds(1), Seconds(1)));

    private static double Volume(double compliance, double step, double timeHigh, double timeLow, double tauI, double tauE)
        => IncompleteRefilling.ReleaseVolume(
            MlPerCmH2O(compliance), CmH2O(5 + step), CmH2O(5), Seconds(timeHigh), Seconds(timeLow), Seconds(tauI), Seconds(tauE)).Millilitres;

    private static double Trapped(double step, double timeHigh, double timeLow, double tauI, double tauE)
        => IncompleteRefilling.TrappedPressure(
            CmH2O(5 + step), CmH2O(5), Seconds(timeHigh), Seconds(timeLow), Seconds(tauI), Seconds(tauE)).CmH2O;
}
