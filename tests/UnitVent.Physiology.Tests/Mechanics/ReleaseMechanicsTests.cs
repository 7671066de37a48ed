using CsCheck;
using static UnitVent.Physiology.Tests.Given;

namespace UnitVent.Physiology.Tests;

/// <summary>Worked from the one-compartment model, as in Burke WC, et al. J Appl Physiol 1993;74:922-933.</summary>
public sealed class ReleaseMechanicsTests
{
    /// <summary>P high, P low, T low, ratio, release volume; end-release pressure, emptied, C, R, peak flow, swing.</summary>
    public static TheoryData<double[], double[]> PublishedReleases => new()
    {
        { [28, 0, 0.5, 0.60, 420], [16.8, 40, 37.5, 26.1, 64.4, 11.2] },
        { [30, 0, 0.5, 0.75, 300], [22.5, 25, 40.0, 43.5, 41.4, 7.5] },
        { [30, 0, 0.5, 0.50, 450], [15.0, 50, 30.0, 24.0, 74.9, 15.0] },
        { [25, 5, 0.8, 0.25, 450], [10.0, 75, 30.0, 19.2, 62.4, 15.0] },
        { [24, 0, 0.4, 0.70, 250], [16.8, 30, 34.7, 32.3, 44.6, 7.2] },
    };

    /// <summary>Resistance, compliance and time constant of two simulated lungs: letter in Crit Care 2013, table cc12561.</summary>
    public static TheoryData<double, double, double> PublishedProducts => new()
    {
        { 5, 50, 0.25 },
        { 21, 95, 1.995 },
    };

    [Theory, MemberData(nameof(PublishedReleases))]
    public void Mechanics_OfPublishedRelease_AreAsPublished(double[] release, double[] expected)
    {
        var (high, low, ratio, volume) = (CmH2O(release[0]), CmH2O(release[1]), release[3], Ml(release[4]));
        var tau = ExpiratoryTimeConstant.Compute(Seconds(release[2]), ratio);
        var compliance = ReleaseMechanics.EffectiveCompliance(volume, high, low, ratio);

        Assert.Equal(expected[0], ReleaseMechanics.EndReleaseAlveolarPressure(high, low, ratio).CmH2O, 1e-9);
        Assert.Equal(expected[1], ReleaseMechanics.EmptiedPercent(ratio), 1e-9);
        Assert.Equal(expected[2], compliance.MlPerCmH2O, 0.051);
        Assert.Equal(expected[3], ReleaseMechanics.EffectiveResistance(tau, compliance).CmH2OSecondsPerLitre, 0.051);
        Assert.Equal(expected[4], ReleaseMechanics.ModelPeakFlow(volume, tau, ratio).LitresPerMinute, 0.051);
        Assert.Equal(expected[5], ReleaseMechanics.AlveolarSwing(high, low, ratio).CmH2O, 1e-9);
    }

    [Theory, MemberData(nameof(PublishedProducts))]
    public void EffectiveResistance_OfPublishedLung_IsItsResistance(double resistance, double compliance, double tau)
        => Assert.Equal(resistance, ReleaseMechanics.EffectiveResistance(Seconds(tau), MlPerCmH2O(compliance)).CmH2OSecondsPerLitre, 1e-9);

    [Theory]
    [InlineData(1, 63.2)]
    [InlineData(2, 86.5)]
    [InlineData(3, 95.0)]
    [InlineData(4, 98.2)]
    [InlineData(5, 99.3)]
    public void EmptiedPercent_AfterSomeTimeConstants_IsThePublishedShare(double timeConstants, double expected)
        => Assert.Equal(expected, ReleaseMechanics.EmptiedPercent(Math.Exp(-timeConstants)), 0.051);

    [Fact]
    public void TrappedAndSwing_OfAnyRelease_AddUpToTheStep()
        => Gen.Select(Gen.Double[0.1, 50], Gen.Double[0, 20], Gen.Double[0, 0.99]).Sample((step, low, ratio) =>
        {
            var (high, floor) = (CmH2O(low + step), CmH2O(low));
            var trapped = ReleaseMechanics.EndReleaseAlveolarPressure(high, floor, ratio).CmH2O - low;
            return Math.Abs(trapped + ReleaseMechanics.AlveolarSwing(high, floor, ratio).CmH2O - step) < 1e-9;
        });

    [Theory]
    [InlineData(1)]
    [InlineData(-0.01)]
    [InlineData(double.NaN)]
    public void Mechanics_OfAnImpossibleRatio_AreRefused(double ratio)
    {
        Expect.Refused(() => ReleaseMechanics.EndReleaseAlveolarPressure(CmH2O(28), CmH2O(0), ratio));
        Expect.Refused(() => ReleaseMechanics.EmptiedPercent(ratio));
        Expect.Refused(() => ReleaseMechanics.AlveolarSwing(CmH2O(28), CmH2O(0), ratio));
        Expect.Refused(() => ReleaseMechanics.EffectiveCompliance(Ml(420), CmH2O(28), CmH2O(0), ratio));
        Expect.Refused(() => ReleaseMechanics.ModelPeakFlow(Ml(420), Seconds(1), ratio));
    }

    [Fact]
    public void Pressures_WithoutAStep_AreRefused()
    {
        Expect.Refused(() => ReleaseMechanics.EndReleaseAlveolarPressure(CmH2O(5), CmH2O(5), 0.5));
        Expect.Refused(() => ReleaseMechanics.AlveolarSwing(CmH2O(4), CmH2O(5), 0.5));
    }

    [Theory]
    [InlineData(420, 0.97, true)] // swing 0.84 cmH2O
    [InlineData(420, 0.9701, false)]
    [InlineData(0, 0.6, false)]
    public void CanEstimateCompliance_AroundItsLimits_DecidesWhetherComplianceRefuses(double volume, double ratio, bool expected)
    {
        var (high, low) = (CmH2O(28.001), CmH2O(0));

        Assert.Equal(expected, ReleaseMechanics.CanEstimateCompliance(Ml(volume), high, low, ratio));
        Assert.Equal(expected, Record.Exception(() => ReleaseMechanics.EffectiveCompliance(Ml(volume), high, low, ratio)) is null);
    }

    [Theory]
    [InlineData(0.1001, true)] // 0.5 L leave within 0.1 s
    [InlineData(0.1, true)] // 300 L/min itself
    [InlineData(0.0999, false)]
    [InlineData(0, false)]
    public void CanModelPeakFlow_AroundItsLimits_DecidesWhetherPeakFlowRefuses(double tau, bool expected)
    {
        Assert.Equal(expected, ReleaseMechanics.CanModelPeakFlow(Ml(500), Seconds(tau), 0));
        Assert.Equal(expected, Record.Exception(() => ReleaseMechanics.ModelPeakFlow(Ml(500), Seconds(tau), 0)) is null);
    }

    [Fact]
    public void CanEstimateCompliance_OfTheHighestCompliance_IsTrue()
        => Assert.True(ReleaseMechanics.CanEstimateCompliance(Ml(500), CmH2O(1), CmH2O(0), 0));

    [Fact]
    public void ModelPeakFlow_WithoutATimeConstant_SaysSo()
        => Expect.RefusedSaying("Parameter 'tau'", () => ReleaseMechanics.ModelPeakFlow(Ml(500), default, 0));

    [Fact]
    public void EffectiveResistance_WithoutCompliance_Refuses()
        => Expect.RefusedSaying("Parameter 'compliance'", () => ReleaseMechanics.EffectiveResistance(Seconds(1), default));
}
