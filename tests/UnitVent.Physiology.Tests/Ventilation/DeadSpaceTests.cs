using CsCheck;
using static UnitVent.Physiology.Tests.Given;

namespace UnitVent.Physiology.Tests;

public sealed class DeadSpaceTests
{
    /// <summary>Worked from Enghoff H. Uppsala Läkareforen Förh 1938;44:191-218 (from memory): PaCO2, mixed expired, fraction.</summary>
    public static TheoryData<double, double, double> PublishedEnghoff => new()
    {
        { 40, 28, 0.30 },
        { 50, 20, 0.60 },
        { 60, 22, 0.633 },
    };

    /// <summary>Worked from Beitler JR, et al. Crit Care Med 2015;43:1026-1035 (from memory): mL/min, L/min, PaCO2, fraction.</summary>
    public static TheoryData<double, double, double, double> PublishedFromOutput => new()
    {
        { 200, 10, 50, 0.655 },
        { 188.4, 9, 48, 0.624 },
        { 154.77, 8, 44, 0.621 }, // with the output rounded to 154.8 the printed digit would be 0.620
        { 200, 5, 40, 0.137 },
    };

    /// <summary>Mass balance of carbon dioxide: mL/min, PaCO2, alveolar ventilation in L/min.</summary>
    public static TheoryData<double, double, double> PublishedIdentity => new()
    {
        { 200, 40, 4.32 }, // 4.315
        { 250, 60, 3.60 },
        { 200, 50, 3.45 },
    };

    [Theory, MemberData(nameof(PublishedEnghoff))]
    public void Enghoff_OfPublishedTensions_IsThePublishedFraction(double arterial, double expired, double expected)
        => Assert.Equal(expected, DeadSpace.Enghoff(MmHg(arterial), MmHg(expired)), 0.00051);

    [Theory, MemberData(nameof(PublishedFromOutput))]
    public void FromCarbonDioxideOutput_OfPublishedReadings_IsThePublishedFraction(double output, double ventilation, double arterial, double expected)
        => Assert.Equal(expected, DeadSpace.FromCarbonDioxideOutput(output, LMin(ventilation), MmHg(arterial)), 0.00051);

    [Theory, MemberData(nameof(PublishedIdentity))]
    public void AlveolarLitresPerMinute_OfPublishedOutput_IsThePublishedVentilation(double output, double arterial, double expected)
        => Assert.Equal(expected, DeadSpace.AlveolarLitresPerMinute(output, MmHg(arterial)), 0.0051);

    [Theory]
    [InlineData(40, 36, true)] // 0.9 exactly
    [InlineData(40, 36.1, false)] // end-tidal
    [InlineData(40, 0, true)]
    [InlineData(0, 0, false)]
    public void IsMixedExpired_AroundItsLimit_DecidesWhetherEnghoffRefuses(double arterial, double expired, bool expected)
    {
        Assert.Equal(expected, DeadSpace.IsMixedExpired(MmHg(arterial), MmHg(expired)));
        Assert.Equal(expected, Record.Exception(() => DeadSpace.Enghoff(MmHg(arterial), MmHg(expired))) is null);
    }

    [Theory]
    [InlineData(0.1, true)]
    [InlineData(0.95, true)]
    [InlineData(0.099, false)]
    [InlineData(0.951, false)]
    [InlineData(double.NaN, false)]
    public void IsPlausible_AroundItsLimits_IsFalseOutside(double fraction, bool expected) => Assert.Equal(expected, DeadSpace.IsPlausible(fraction));

    [Theory]
    [InlineData(-0.1)]
    [InlineData(2000.1)]
    [InlineData(double.NaN)]
    public void Output_ThatIsImpossible_IsRefused(double output)
    {
        Expect.Refused(() => DeadSpace.FromCarbonDioxideOutput(output, LMin(8), MmHg(40)));
        Expect.Refused(() => DeadSpace.AlveolarLitresPerMinute(output, MmHg(40)));
    }

    [Fact]
    public void Output_AtItsLimits_IsTaken()
    {
        Assert.Equal(0, DeadSpace.AlveolarLitresPerMinute(0, MmHg(40)));
        Assert.Equal(43.15, DeadSpace.AlveolarLitresPerMinute(2000, MmHg(40)), 1e-9);
    }

    [Fact]
    public void Equations_WithoutAnInput_Refuse()
    {
        Expect.Refused(() => DeadSpace.FromCarbonDioxideOutput(200, default, MmHg(40)));
        Expect.Refused(() => DeadSpace.FromCarbonDioxideOutput(200, LMin(8), default));
        Expect.Refused(() => DeadSpace.AlveolarLitresPerMinute(200, default));
    }

    [Fact]
    public void DeadAndAlveolarVentilation_AddUpToAll()
        => Gen.Select(Gen.Double[100, 400], Gen.Double[4, 20], Gen.Double[20, 100]).Sample((output, ventilation, arterial) =>
            Math.Abs((DeadSpace.FromCarbonDioxideOutput(output, LMin(ventilation), MmHg(arterial)) * ventilation)
                + DeadSpace.AlveolarLitresPerMinute(output, MmHg(arterial)) - ventilation) < 1e-9);

    [Fact]
    public void Enghoff_OfAnEndTidalTension_SaysWhy()
        => Expect.RefusedSaying("at most 0.9 of the arterial", () => DeadSpace.Enghoff(MmHg(40), MmHg(38)));
}
