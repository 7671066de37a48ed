using CsCheck;
using static UnitVent.Physiology.Tests.Given;

namespace UnitVent.Physiology.Tests;

/// <summary>Worked from the one-compartment model, as in Burke WC, et al. J Appl Physiol 1993;74:922-933.</summary>
public sealed class ExpiratoryTimeConstantTests
{
    /// <summary>T low, ratio, tau, then the T low that would end the release at 75, 50 and 25 %.</summary>
    public static TheoryData<double, double, double, double, double, double> PublishedReleases => new()
    {
        { 0.5, 0.60, 0.979, 0.282, 0.678, 1.357 }, // 0.67846: 0.679 in print would be tau rounded first
        { 0.5, 0.75, 1.738, 0.500, 1.205, 2.409 },
        { 0.5, 0.50, 0.721, 0.208, 0.500, 1.000 }, // 0.20752: 0.207 in print would be cut off
        { 0.8, 0.25, 0.577, 0.166, 0.400, 0.800 },
        { 0.4, 0.70, 1.121, 0.323, 0.777, 1.555 },
    };

    /// <summary>Ratio, and how many times a relative error of it is enlarged in tau.</summary>
    public static TheoryData<double, double> PublishedSensitivities => new()
    {
        { 0.90, 9.5 },
        { 0.75, 3.48 },
        { 0.50, 1.44 },
        { 0.25, 0.72 },
    };

    [Theory, MemberData(nameof(PublishedReleases))]
    public void Tau_OfPublishedRelease_AndItsTargets_AreAsPublished(double timeLow, double ratio, double tau, double at75, double at50, double at25)
    {
        var actual = ExpiratoryTimeConstant.Compute(Seconds(timeLow), ratio);

        Assert.Equal(tau, actual.Seconds, 0.00051);
        Assert.Equal(at75, ExpiratoryTimeConstant.TimeLowFor(actual, 0.75).Seconds, 0.00051);
        Assert.Equal(at50, ExpiratoryTimeConstant.TimeLowFor(actual, 0.50).Seconds, 0.00051);
        Assert.Equal(at25, ExpiratoryTimeConstant.TimeLowFor(actual, 0.25).Seconds, 0.00051);
    }

    [Theory]
    [InlineData(0.75, 0.2877)]
    [InlineData(0.50, 0.6931)]
    [InlineData(0.25, 1.3863)]
    public void TimeLowFor_OneSecondOfTau_IsThePublishedMultiplier(double target, double expected)
        => Assert.Equal(expected, ExpiratoryTimeConstant.TimeLowFor(Seconds(1), target).Seconds, 0.00005);

    [Theory, MemberData(nameof(PublishedSensitivities))]
    public void Tau_OnASmallErrorOfTheRatio_ErrsByThePublishedFactor(double ratio, double factor)
    {
        const double relativeError = 1e-6;
        var exact = ExpiratoryTimeConstant.Compute(Seconds(0.5), ratio).Seconds;
        var disturbed = ExpiratoryTimeConstant.Compute(Seconds(0.5), ratio * (1 + relativeError)).Seconds;

        Assert.Equal(factor, (disturbed - exact) / exact / relativeError, 0.01);
    }

    [Fact]
    public void TimeLowFor_TheRatioMeasured_IsTheTimeSet()
        => Gen.Select(Gen.Double[0.1, 3], Gen.Double[0.02, 0.95]).Sample((timeLow, ratio) =>
            Math.Abs(ExpiratoryTimeConstant.TimeLowFor(ExpiratoryTimeConstant.Compute(Seconds(timeLow), ratio), ratio).Seconds - timeLow) < 1e-9);

    [Theory]
    [InlineData(0.0199, false)]
    [InlineData(0.02, true)]
    [InlineData(0.95, true)]
    [InlineData(0.9501, false)]
    [InlineData(double.NaN, false)]
    public void IsReliable_AroundItsLimits_IsTrueInside(double ratio, bool expected)
        => Assert.Equal(expected, ExpiratoryTimeConstant.IsReliable(ratio));

    [Theory]
    [InlineData(0.5, 0, false)]
    [InlineData(0.5, 0.001, true)]
    [InlineData(0.5, 1e-9, true)] // the lowest ratio there is
    [InlineData(0.5, 9e-10, false)]
    [InlineData(1e-15, 0.9999999999999999, true)] // the highest ratio there is
    [InlineData(60, 0.36787944117144233, true)] // tau of 60 s itself
    [InlineData(0.5, 0.9915, true)] // 58.6 s
    [InlineData(0.5, 0.9918, false)] // 60.7 s
    [InlineData(0.5, 1, false)]
    [InlineData(0.5, 1.01, false)]
    [InlineData(0.5, -0.1, false)]
    [InlineData(0.5, double.NaN, false)]
    [InlineData(0, 0.5, false)]
    public void IsDefined_AroundItsLimits_DecidesWhetherComputeRefuses(double timeLow, double ratio, bool expected)
    {
        Assert.Equal(expected, ExpiratoryTimeConstant.IsDefined(Seconds(timeLow), ratio));
        Assert.Equal(expected, Record.Exception(() => ExpiratoryTimeConstant.Compute(Seconds(timeLow), ratio)) is null);
    }

    [Theory]
    [InlineData(0, 0.5)]
    [InlineData(1, 0)]
    [InlineData(1, 1)]
    [InlineData(1, double.NaN)]
    [InlineData(60, 0.36)] // just above tau itself
    public void TimeLowFor_OutsideItsLimits_Refuses(double tau, double target)
        => Expect.Refused(() => ExpiratoryTimeConstant.TimeLowFor(Seconds(tau), target));
}
