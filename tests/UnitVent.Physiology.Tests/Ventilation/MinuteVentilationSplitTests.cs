using CsCheck;
using static UnitVent.Physiology.Tests.Given;

namespace UnitVent.Physiology.Tests;

public sealed class MinuteVentilationSplitTests
{
    /// <summary>Volumes add up: total, release volume, release rate, spontaneous part, share, whether 0 stands for a small negative.</summary>
    public static TheoryData<double, double, double, double, double, bool> PublishedSplits => new()
    {
        { 8.0, 420, 12, 2.96, 37.0, false },
        { 7.0, 450, 12, 1.60, 22.9, false },
        { 5.2, 420, 12, 0.16, 3.1, false },
        { 4.9, 420, 12, 0, 0, true },
        { 9.6, 300, 14, 5.40, 56.3, false },
        { 5.0, 500, 10, 0, 0, false }, // equal: nothing had to be forgiven
    };

    /// <summary>Common practice: a release part up to 5 % above the total is measurement error.</summary>
    public static TheoryData<double, double, bool, string> AllowedExcess => new()
    {
        { 8.0, 8.0, false, "equal: no breath of the patient's own" },
        { 8.0, 8.4, false, "5 % exactly" },
        { 8.0, 8.41, true, "just above 5 %" },
        { 0, 0.1, true, "releases, but no ventilation" },
    };

    [Theory, MemberData(nameof(PublishedSplits))]
    public void DeriveSpontaneous_OnPublishedReadings_ReturnsPublishedShare(
        double total, double volume, double rate, double spontaneous, double sharePercent, bool withinError)
    {
        var actual = MinuteVentilationSplit.DeriveSpontaneous(LMin(total), MinuteVentilationSplit.Release(Ml(volume), PerMin(rate)));

        Assert.Equal(spontaneous, actual.Spontaneous.LitresPerMinute, 0.0051);
        Assert.Equal(sharePercent, actual.SharePercent, 0.051);
        Assert.Equal(withinError, actual.WithinMeasurementError);
    }

    [Theory, MemberData(nameof(AllowedExcess))]
    public void ReleaseExceedsTotal_AroundTheAllowance_DecidesWhetherDeriveRefuses(double total, double release, bool expected, string reason)
    {
        Assert.True(expected == MinuteVentilationSplit.ReleaseExceedsTotal(LMin(total), LMin(release)), reason);
        Assert.Equal(expected, Record.Exception(() => MinuteVentilationSplit.DeriveSpontaneous(LMin(total), LMin(release))) is not null);
    }

    [Fact]
    public void Split_OfNoVentilation_Refuses()
    {
        Expect.Refused(() => MinuteVentilationSplit.DeriveSpontaneous(LMin(0), LMin(0)));
        Expect.Refused(() => MinuteVentilationSplit.Share(LMin(1), LMin(0)));
    }

    [Fact]
    public void Release_AroundTheHighestVentilation_RefusesAboveIt()
    {
        Assert.Equal(60, MinuteVentilationSplit.Release(Ml(1000), PerMin(60)).LitresPerMinute, 1e-9);
        Expect.Refused(() => MinuteVentilationSplit.Release(Ml(1001), PerMin(60)));
    }

    [Fact]
    public void Share_OfContradictingReadings_ExceedsAHundred() => Assert.Equal(125, MinuteVentilationSplit.Share(LMin(5), LMin(4)), 1e-9);

    [Fact]
    public void Parts_OfAnySplit_AddUpToTheTotal()
        => Gen.Select(Gen.Double[0.5, 40], Gen.Double[0, 1]).Sample((total, part) =>
        {
            var split = MinuteVentilationSplit.DeriveSpontaneous(LMin(total), LMin(total * part));
            return Math.Abs(split.Spontaneous.LitresPerMinute + (total * part) - total) < 1e-9 && split.SharePercent is >= 0 and <= 100;
        });

    [Fact]
    public void DeriveSpontaneous_OfContradictingReadings_SaysWhy()
        => Expect.RefusedSaying("exceeds the total by more than 5 %", () => MinuteVentilationSplit.DeriveSpontaneous(LMin(5), LMin(6)));
}
