using static UnitVent.Physiology.Tests.Given;

namespace UnitVent.Physiology.Tests;

public sealed class RapidShallowBreathingTests
{
    /// <summary>Worked from Yang KL, Tobin MJ. N Engl J Med 1991;324:1445-1450, threshold 105: rate, mL, index.</summary>
    public static TheoryData<double, double, double> PublishedIndices => new()
    {
        { 20, 400, 50 },
        { 30, 250, 120 },
        { 35, 333.3, 105 },
        { 21, 200, 105 },
    };

    [Theory, MemberData(nameof(PublishedIndices))]
    public void Compute_OnPublishedInputs_ReturnsPublishedIndex(double rate, double millilitres, double expected)
        => Assert.Equal(expected, RapidShallowBreathing.Compute(PerMin(rate), Ml(millilitres)), 0.05);

    [Fact]
    public void Compute_WithoutBreaths_Refuses()
    {
        Expect.Refused(() => RapidShallowBreathing.Compute(PerMin(0), Ml(400)));
        Expect.Refused(() => RapidShallowBreathing.Compute(PerMin(20), Ml(0)));
    }
}
