namespace UnitVent.Physiology.Tests;

public sealed class AnionGapTests
{
    /// <summary>Common practice: sodium, chloride, bicarbonate, gap.</summary>
    public static TheoryData<double, double, double, double> PublishedGaps => new()
    {
        { 140, 104, 24, 12 },
        { 140, 100, 12, 28 },
    };

    [Theory, MemberData(nameof(PublishedGaps))]
    public void Compute_OnPublishedPlasma_ReturnsPublishedGap(double sodium, double chloride, double bicarbonate, double expected)
        => Assert.Equal(expected, AnionGap.Compute(sodium, chloride, bicarbonate), 1e-9);

    /// <summary>Figge J, et al. Crit Care Med 1998;26:1807-1810, from memory.</summary>
    [Theory]
    [InlineData(28, 20, 33)]
    [InlineData(12, 40, 12)]
    public void AlbuminCorrected_OnPublishedGap_ReturnsPublishedGap(double gap, double albumin, double expected)
        => Assert.Equal(expected, AnionGap.AlbuminCorrected(gap, albumin), 1e-9);

    [Theory]
    [InlineData(-0.1)]
    [InlineData(1000.1)]
    [InlineData(double.NaN)]
    public void Compute_OnAnImpossibleConcentration_Refuses(double value)
    {
        Expect.Refused(() => AnionGap.Compute(value, 104, 24));
        Expect.Refused(() => AnionGap.Compute(140, value, 24));
        Expect.Refused(() => AnionGap.Compute(140, 104, value));
    }

    [Theory]
    [InlineData(-2000.1, 40)]
    [InlineData(1000.1, 40)]
    [InlineData(double.NaN, 40)]
    [InlineData(12, -0.1)]
    [InlineData(12, 100.1)]
    [InlineData(12, double.NaN)]
    public void AlbuminCorrected_OutsideItsLimits_Refuses(double gap, double albumin)
        => Expect.Refused(() => AnionGap.AlbuminCorrected(gap, albumin));

    [Fact]
    public void AnionGap_AtItsLimits_IsComputed()
    {
        Assert.Equal(-2000, AnionGap.Compute(0, 1000, 1000), 1e-9);
        Assert.Equal(-1990, AnionGap.AlbuminCorrected(-2000, 0), 1e-9);
        Assert.Equal(985, AnionGap.AlbuminCorrected(1000, 100), 1e-9);
    }
}
