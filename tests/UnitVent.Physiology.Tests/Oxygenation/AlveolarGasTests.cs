using static UnitVent.Physiology.Tests.Given;

namespace UnitVent.Physiology.Tests;

public sealed class AlveolarGasTests
{
    /// <summary>Standard respiratory physiology: the full form, and beside it the short form with PaCO2/R alone (R 0.8, 47 mmHg).</summary>
    public static TheoryData<double, double, double, double, double> PublishedTensions => new()
    {
        { 0.21, 760, 40, 101.83, 99.73 },
        { 0.50, 760, 40, 311.50, 306.50 },
        { 1.0, 760, 40, 673.0, 663.0 },
        { 0.60, 760, 50, 372.80, 365.30 },
        { 0.40, 630, 38, 189.50, 185.70 },
    };

    /// <summary>At 760 mmHg: FiO2, PaCO2, PaO2, then gradient and ratio. Standard respiratory physiology.</summary>
    public static TheoryData<double, double, double, double, double> PublishedGradients => new()
    {
        { 0.50, 40, 80, 231.5, 0.257 },
        { 0.21, 40, 95, 6.8, 0.933 },
        { 0.60, 50, 72, 300.8, 0.193 },
    };

    [Theory, MemberData(nameof(PublishedTensions))]
    public void AlveolarPO2_OnPublishedInputs_ReturnsThePublishedFullForm(double fiO2, double barometric, double paCO2, double full, double simplified)
    {
        var actual = Alveolar(fiO2, barometric, paCO2).MmHg;

        Assert.Equal(full, actual, 0.0051);
        Assert.Equal(simplified, actual - (fiO2 * paCO2 * 0.25), 0.0051); // the term the short form leaves out
    }

    [Theory, MemberData(nameof(PublishedGradients))]
    public void Comparisons_OnPublishedInputs_ReturnPublishedGradientAndRatio(double fiO2, double paCO2, double paO2, double gradient, double ratio)
    {
        var alveolar = Alveolar(fiO2, 760, paCO2);

        Assert.Equal(gradient, AlveolarGas.ArterialGradientMmHg(alveolar, MmHg(paO2)), 0.05);
        Assert.Equal(ratio, AlveolarGas.ArterialAlveolarRatio(alveolar, MmHg(paO2)), 0.0005);
    }

    /// <summary>The worked example of a university teaching page: room air, PaCO2 30, PaO2 80 give 114 and 34 (common practice).</summary>
    [Fact]
    public void Gradient_OfTheTeachingExample_Is34()
        => Assert.Equal(34, AlveolarGas.ArterialGradientMmHg(Alveolar(0.21, 760, 30), MmHg(80)), 0.5);

    [Theory]
    [InlineData(125.0, true, "150 mmHg inspired, 1.2 times PaCO2 removed: just enough")]
    [InlineData(125.1, false, "nothing is left")]
    public void IsDefined_AroundTheHighestPaCO2OnRoomAir_DecidesWhetherAlveolarPO2Refuses(double paCO2, bool expected, string reason)
    {
        Assert.True(expected == AlveolarGas.IsDefined(FiO2(0.21), BarometricPressure.FromMmHg(760), MmHg(paCO2)), reason);
        Assert.Equal(expected, Record.Exception(() => Alveolar(0.21, 760, paCO2)) is null);
    }

    [Fact]
    public void IsDefined_WhereExactlyNothingIsLeft_IsFalse()
    {
        Assert.False(AlveolarGas.IsDefined(FiO2(1), BarometricPressure.FromMmHg(247), MmHg(200)));
        Expect.Refused(() => Alveolar(1, 247, 200));
    }

    [Fact]
    public void Equations_WithoutAnInput_Refuse()
    {
        Expect.RefusedSaying("Parameter 'fiO2'", () => AlveolarGas.AlveolarPO2(default, BarometricPressure.FromMmHg(760), MmHg(40)));
        Expect.RefusedSaying("Parameter 'barometric'", () => AlveolarGas.AlveolarPO2(FiO2(0.5), default, MmHg(40)));
        Expect.RefusedSaying("Parameter 'paCO2'", () => Alveolar(0.21, 760, 130));
        Expect.Refused(() => AlveolarGas.ArterialAlveolarRatio(default, MmHg(80)));
    }

    /// <summary>From memory: a quarter of the age and 4.</summary>
    [Theory]
    [InlineData(18, 8.5)]
    [InlineData(60, 19)]
    [InlineData(120, 34)]
    public void ExpectedGradient_OnAir_GrowsWithAge(double years, double expected) => Assert.Equal(expected, AlveolarGas.ExpectedGradientOnAirMmHg(years), 12);

    [Theory]
    [InlineData(17.999)]
    [InlineData(120.001)]
    [InlineData(double.NaN)]
    public void ExpectedGradient_OutsideAdultYears_IsRefused(double years)
        => Assert.Throws<ArgumentOutOfRangeException>(() => AlveolarGas.ExpectedGradientOnAirMmHg(years));

    private static PartialPressure Alveolar(double fiO2, double barometric, double paCO2)
        => AlveolarGas.AlveolarPO2(FiO2(fiO2), BarometricPressure.FromMmHg(barometric), MmHg(paCO2));
}
