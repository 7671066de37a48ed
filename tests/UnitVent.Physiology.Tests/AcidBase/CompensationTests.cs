using System.Runtime.CompilerServices;
using CsCheck;
using static UnitVent.Physiology.RespiratoryOnset;
using static UnitVent.Physiology.Tests.Given;

namespace UnitVent.Physiology.Tests;

/// <summary>Berend K, et al. N Engl J Med 2014;371:1434-1445, through summaries.</summary>
public sealed class CompensationTests
{
    /// <summary>Bicarbonate and the PCO2 expected in the middle of the range.</summary>
    public static TheoryData<double, double> PublishedMetabolicAcidosis => new()
    {
        { 6, 17.0 },
        { 12, 26.0 },
        { 14.4, 29.6 },
        { 16, 32.0 },
        { 20, 38.0 },
    };

    /// <summary>Bicarbonate and the PCO2 expected in the middle of the range; from 45.4 on the ceiling of 55 (common practice).</summary>
    public static TheoryData<double, double> PublishedMetabolicAlkalosis => new()
    {
        { 30, 44.2 },
        { 36, 48.4 },
        { 42, 52.6 },
        { 46, 55 },
        { 60, 55 },
    };

    /// <summary>PCO2, onset, then the range of bicarbonate.</summary>
    public static TheoryData<double, RespiratoryOnset, double, double, string> PublishedRespiratory => new()
    {
        { 60, Acute, 24, 28, "26 ± 2" },
        { 60, Chronic, 31, 34, "3.5 to 5 for each 10 mmHg" },
        { 60, Between, 24, 34, "from the one to the other" },
        { 90, Acute, 27, 31, "29 ± 2" },
        { 180, Acute, 36, 40, "38 ± 2" },
        { 200, Acute, 36, 40, "the acute limit (common practice)" },
        { 20, Acute, 18, 22, "20 ± 2" },
        { 20, Chronic, 14, 16, "4 to 5 for each 10 mmHg" },
        { 20, Between, 14, 22, "from the other to the one" },
        { 40, Acute, 22, 26, "nothing to answer, ± 2" },
        { 40, Chronic, 24, 24, "nothing to answer" },
        { 40, Between, 22, 26, "nothing to answer, ± 2" },
    };

    [Theory, MemberData(nameof(PublishedMetabolicAcidosis))]
    public void PCO2InMetabolicAcidosis_OfPublishedBicarbonate_IsAsPublished(double bicarbonate, double expected)
        => IsAround(expected, 2, Compensation.PCO2InMetabolicAcidosis(MmolPerL(bicarbonate)));

    [Theory, MemberData(nameof(PublishedMetabolicAlkalosis))]
    public void PCO2InMetabolicAlkalosis_OfPublishedBicarbonate_IsAsPublished(double bicarbonate, double expected)
        => IsAround(expected, 5, Compensation.PCO2InMetabolicAlkalosis(MmolPerL(bicarbonate)));

    [Theory, MemberData(nameof(PublishedRespiratory))]
    public void BicarbonateInRespiratory_OfPublishedPCO2_IsAsPublished(double pCO2, RespiratoryOnset onset, double lowest, double highest, string reason)
    {
        var actual = Compensation.BicarbonateInRespiratory(MmHg(pCO2), onset);

        Expect.Near(lowest, actual.Lowest, 1e-9, reason);
        Expect.Near(highest, actual.Highest, 1e-9, reason);
    }

    [Fact]
    public void Between_OfAnyPCO2_HoldsTheAcuteAndTheChronicRange()
        => Gen.Double[5, 150].Sample(pCO2 =>
        {
            var ranges = new[] { Acute, Chronic }.Select(onset => Compensation.BicarbonateInRespiratory(MmHg(pCO2), onset)).ToList();
            var between = Compensation.BicarbonateInRespiratory(MmHg(pCO2), Between);
            return ranges.All(range => between.Lowest <= range.Lowest && range.Lowest <= range.Highest && range.Highest <= between.Highest);
        });

    [Fact]
    public void Answer_OfAGreaterDisturbance_IsGreater()
        => Gen.Select(Gen.Double[5, 100], Gen.Double[0.1, 20], Gen.Enum<RespiratoryOnset>()).Sample((pCO2, more, onset) =>
            Compensation.BicarbonateInRespiratory(MmHg(pCO2 + more), onset).Highest > Compensation.BicarbonateInRespiratory(MmHg(pCO2), onset).Highest);

    [Fact]
    public void Compensation_WithoutAnInput_Refuses()
    {
        Expect.Refused(() => Compensation.PCO2InMetabolicAcidosis(default));
        Expect.Refused(() => Compensation.PCO2InMetabolicAlkalosis(default));
        Expect.Refused(() => Compensation.BicarbonateInRespiratory(default, Acute));
    }

    [Fact]
    public void BicarbonateInRespiratory_OfAnOnsetThatDoesNotExist_Throws()
        => Assert.Throws<SwitchExpressionException>(() => Compensation.BicarbonateInRespiratory(MmHg(60), (RespiratoryOnset)9));

    private static void IsAround(double expected, double band, ExpectedRange actual)
    {
        Assert.Equal(expected - band, actual.Lowest, 1e-9);
        Assert.Equal(expected + band, actual.Highest, 1e-9);
    }
}
