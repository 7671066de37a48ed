using static UnitVent.Physiology.AcidBasePattern;
using static UnitVent.Physiology.CompensationFinding;
using static UnitVent.Physiology.RespiratoryOnset;
using static UnitVent.Physiology.Tests.Given;

namespace UnitVent.Physiology.Tests;

/// <summary>Berend K, et al. N Engl J Med 2014;371:1434-1445, through summaries; usual ranges are common practice.</summary>
public sealed class AcidBaseInterpretationTests
{
    /// <summary>pH, PCO2, bicarbonate, onset, pattern and finding.</summary>
    public static TheoryData<double[], RespiratoryOnset, AcidBasePattern, CompensationFinding?, string> PublishedGases => new()
    {
        { [7.25, 60, 26], Acute, RespiratoryAcidosis, AsExpected, "acute respiratory acidosis" },
        { [7.25, 60, 26], Between, RespiratoryAcidosis, AsExpected, "the same with an onset that is not known" },
        { [7.25, 60, 26], Chronic, RespiratoryAcidosis, Below, "in days the bicarbonate would have risen to 31" },
        { [7.30, 30, 14.4], Acute, MetabolicAcidosis, AsExpected, "expected 29.6" },
        { [7.10, 90, 27.3], Acute, RespiratoryAcidosis, AsExpected, "acute, expected 29" },
        { [7.40, 60, 36], Between, MixedOrCompensated, null, "both sides off, the pH usual" },
    };

    /// <summary>What each branch answers; the gases obey the law of mass action (computed).</summary>
    public static TheoryData<double[], RespiratoryOnset, AcidBasePattern, CompensationFinding?, string> Gases => new()
    {
        { [7.40, 40, 24.2], Acute, Usual, null, "nothing off" },
        { [7.45, 34, 23], Acute, Usual, null, "PCO2 low alone" },
        { [7.35, 46, 25], Acute, Usual, null, "PCO2 high alone" },
        { [7.35, 39, 21.5], Acute, Usual, null, "bicarbonate low alone" },
        { [7.45, 40, 26.5], Acute, Usual, null, "bicarbonate high alone" },
        { [7.36, 34, 19], Acute, MixedOrCompensated, null, "both low" },
        { [7.34, 44, 23], Acute, Unexplained, null, "acid by little, neither side off" },
        { [7.46, 36, 25], Acute, Unexplained, null, "alkaline by little, neither side off" },
        { [7.10, 60, 18.2], Acute, CombinedAcidosis, null, "both acid" },
        { [7.60, 30, 28.8], Acute, CombinedAlkalosis, null, "both alkaline" },
        { [7.20, 40, 15.3], Acute, MetabolicAcidosis, Above, "PCO2 of 31 expected" },
        { [7.34, 21, 11], Acute, MetabolicAcidosis, Below, "PCO2 of 24.5 expected" },
        { [7.50, 46, 35], Acute, MetabolicAlkalosis, AsExpected, "PCO2 of 47.7 expected" },
        { [7.47, 60, 42.7], Acute, MetabolicAlkalosis, Above, "PCO2 of 53 expected" },
        { [7.60, 38, 36.5], Acute, MetabolicAlkalosis, Below, "PCO2 of 49 expected" },
        { [7.60, 20, 19.2], Acute, RespiratoryAlkalosis, AsExpected, "acute, 20 expected" },
        { [7.60, 20, 19.2], Chronic, RespiratoryAlkalosis, Above, "14–16 expected in days" },
        { [7.50, 18, 13.7], Acute, RespiratoryAlkalosis, Below, "19.6 expected at once" },
        { [7.33, 80, 41], Acute, RespiratoryAcidosis, Above, "28 expected at once" },
        { [7.33, 80, 41], Chronic, RespiratoryAcidosis, AsExpected, "38–44 expected in days" },
        { [7.23, 60, 30], Acute, DoesNotFit, null, "pH off by 0.087" },
        { [7.32, 48, 16], Acute, DoesNotFit, null, "pH off by -0.179" },
    };

    /// <summary>Each usual range at its end and just beyond it.</summary>
    public static TheoryData<double[], AcidBasePattern, string> Edges => new()
    {
        { [7.35, 46, 25], Usual, "pH 7.35 itself is usual" },
        { [7.349, 46, 25], RespiratoryAcidosis, "pH below 7.35" },
        { [7.45, 34, 23], Usual, "pH 7.45 itself is usual" },
        { [7.451, 34, 23], RespiratoryAlkalosis, "pH above 7.45" },
        { [7.34, 45, 23.5], Unexplained, "PCO2 45 itself is usual" },
        { [7.34, 45.1, 23.5], RespiratoryAcidosis, "PCO2 above 45" },
        { [7.46, 35, 24.1], Unexplained, "PCO2 35 itself is usual" },
        { [7.46, 34.9, 24.1], RespiratoryAlkalosis, "PCO2 below 35" },
        { [7.34, 42, 22], Unexplained, "bicarbonate 22 itself is usual" },
        { [7.34, 42, 21.9], MetabolicAcidosis, "bicarbonate below 22" },
        { [7.46, 38, 26], Unexplained, "bicarbonate 26 itself is usual" },
        { [7.46, 38, 26.1], MetabolicAlkalosis, "bicarbonate above 26" },
        { [7.35, 45, 22], Usual, "both at their ends" },
        { [7.36, 34.9, 21.9], MixedOrCompensated, "both low, just beyond" },
        { [7.40, 45.1, 26.1], MixedOrCompensated, "both high, just beyond" },
    };

    [Theory, MemberData(nameof(PublishedGases)), MemberData(nameof(Gases))]
    public void Read_OfAGas_GivesPatternAndFinding(
        double[] gas, RespiratoryOnset onset, AcidBasePattern pattern, CompensationFinding? finding, string reason)
    {
        var actual = AcidBaseInterpretation.Read(Ph(gas[0]), MmHg(gas[1]), MmolPerL(gas[2]), onset);

        Assert.True((pattern, finding) == (actual.Pattern, actual.Finding), $"{actual}: {reason}");
        Assert.Equal(finding is null, actual.Expected is null);
    }

    [Theory, MemberData(nameof(Edges))]
    public void Read_AtTheEdgeOfAUsualRange_TakesTheEdgeAsUsual(double[] gas, AcidBasePattern expected, string reason)
    {
        var actual = AcidBaseInterpretation.Read(Ph(gas[0]), MmHg(gas[1]), MmolPerL(gas[2]), Between).Pattern;

        Assert.True(expected == actual, $"Expected {expected}, got {actual}: {reason}.");
    }

    /// <summary>0.06 (common practice): the pH typed is moved from the one the other two give.</summary>
    [Theory]
    [InlineData(0.0599, false)]
    [InlineData(-0.0599, false)]
    [InlineData(0.0601, true)]
    [InlineData(-0.0601, true)]
    public void Read_AroundTheLargestMisfit_SaysNothingBeyond(double moved, bool expected)
    {
        var pH = HendersonHasselbalch.PH(MmolPerL(24), MmHg(40)) + moved;

        Assert.Equal(expected, AcidBaseInterpretation.Read(Ph(pH), MmHg(40), MmolPerL(24), Acute).Pattern == DoesNotFit);
    }

    /// <summary>HCO3 14.4 lets expect 27.6–31.6 mmHg, PCO2 60 at once 24–28 mmol/L, in days 31–34.</summary>
    [Fact]
    public void Expected_OfASingleDisturbance_IsThatOfTheOtherSide()
    {
        Assert.Equal(Compensation.PCO2InMetabolicAcidosis(MmolPerL(14.4)), Expected(7.30, 30, 14.4, Acute));
        Assert.Equal(Compensation.PCO2InMetabolicAlkalosis(MmolPerL(35)), Expected(7.50, 46, 35, Acute));
        Assert.Equal(new(24, 28), Expected(7.25, 60, 26, Acute));
        Assert.Equal(new(31, 34), Expected(7.25, 60, 26, Chronic));
    }

    /// <summary>The ends of 24–28 mmol/L, and of 30–34 mmHg at bicarbonate 16.</summary>
    [Theory]
    [InlineData(7.22, 60, 24, AsExpected)]
    [InlineData(7.22, 60, 23.99, Below)]
    [InlineData(7.28, 60, 28, AsExpected)]
    [InlineData(7.28, 60, 28.01, Above)]
    [InlineData(7.34, 30, 16, AsExpected)]
    [InlineData(7.34, 29.99, 16, Below)]
    [InlineData(7.29, 34, 16, AsExpected)]
    [InlineData(7.29, 34.01, 16, Above)]
    public void Finding_AtTheEndsOfTheRange_TakesThemAsExpected(double pH, double pCO2, double bicarbonate, CompensationFinding expected)
        => Assert.Equal(expected, AcidBaseInterpretation.Read(Ph(pH), MmHg(pCO2), MmolPerL(bicarbonate), Acute).Finding);

    [Fact]
    public void Read_WithoutAnInput_Refuses()
    {
        Expect.Refused(() => AcidBaseInterpretation.Read(default, MmHg(40), MmolPerL(24), Acute));
        Expect.Refused(() => AcidBaseInterpretation.Read(Ph(7.4), default, MmolPerL(24), Acute));
        Expect.Refused(() => AcidBaseInterpretation.Read(Ph(7.4), MmHg(40), default, Acute));
    }

    private static ExpectedRange? Expected(double pH, double pCO2, double bicarbonate, RespiratoryOnset onset)
        => AcidBaseInterpretation.Read(Ph(pH), MmHg(pCO2), MmolPerL(bicarbonate), onset).Expected;
}
