using static UnitVent.Physiology.Tests.Given;

namespace UnitVent.Physiology.Tests;

public sealed class ReleaseTerminationTests
{
    /// <summary>Worked from the definition in Habashi NM. Crit Care Med 2005;33(3 Suppl):S228-S240: end flow, peak flow, ratio.</summary>
    public static TheoryData<double, double, double> PublishedRatios => new()
    {
        { 45, 60, 0.75 },
        { 38.4, 64, 0.60 },
        { 10, 50, 0.20 },
        { 0, 70, 0 },
    };

    [Theory, MemberData(nameof(PublishedRatios))]
    public void Ratio_OfPublishedFlows_IsThePublishedRatio(double end, double peak, double expected)
        => Assert.Equal(expected, ReleaseTermination.Ratio(FlowLMin(peak), FlowLMin(end)), 1e-9);

    [Theory]
    [InlineData(60, 59.9, true)]
    [InlineData(60, 60, false)]
    [InlineData(60, 61, false)]
    [InlineData(0, 0, false)]
    public void IsDefined_AroundEqualFlows_DecidesWhetherRatioRefuses(double peak, double end, bool expected)
    {
        Assert.Equal(expected, ReleaseTermination.IsDefined(FlowLMin(peak), FlowLMin(end)));
        Assert.Equal(expected, Record.Exception(() => ReleaseTermination.Ratio(FlowLMin(peak), FlowLMin(end))) is null);
    }

    [Fact]
    public void Ratio_ThatIsNotDefined_SaysWhy()
        => Expect.RefusedSaying("must be below the peak flow", () => ReleaseTermination.Ratio(FlowLMin(60), FlowLMin(60)));
}
