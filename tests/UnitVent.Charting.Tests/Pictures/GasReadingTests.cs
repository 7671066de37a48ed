using UnitVent.Charting.Entries;
using UnitVent.Charting.Pictures;

namespace UnitVent.Charting.Tests.Pictures;

/// <summary>What a gas is said to look like: N Engl J Med 2014;371:1434-1445 for acid and base, JAMA 2012;307:2526-2533 for oxygenation.</summary>
public sealed class GasReadingTests
{
    public static TheoryData<decimal, decimal, decimal, string> PublishedPatterns => new()
    {
        { 7.25m, 60, 26m, "pattern of a respiratory acidosis. Bicarbonate is as expected" },
        { 7.30m, 30, 14.4m, "pattern of a metabolic acidosis. PaCO2 is as expected for it (28–32 mmHg)" },
        { 7.20m, 40, 15.2m, "PaCO2 is higher than expected for this bicarbonate (29–33 mmHg): an added respiratory acidosis is possible" },
        { 7.40m, 60, 36m, "mixed, or fully compensated" },
        { 7.50m, 45, 34m, "pattern of a metabolic alkalosis" },
        { 7.52m, 25, 20m, "pattern of a respiratory alkalosis" },
        { 7.10m, 60, 18m, "pattern of a combined acidosis" },
        { 7.55m, 30, 26.5m, "pattern of a combined alkalosis" },
        { 7.40m, 40, 24m, "pH 7.40 in the usual range." },
        { 7.34m, 42, 22.2m, "neither PaCO2 42 mmHg nor" },
        { 7.30m, 60, 16m, "do not fit together" },
    };

    [Theory, MemberData(nameof(PublishedPatterns))]
    public void AcidBase_OfAGas_StatesItsPattern(decimal pH, decimal pCO2, decimal bicarbonate, string sentence) =>
        Assert.Contains(sentence, new Chart().With(Chart.Aprv(), Chart.Gas(pH: pH, pCO2: pCO2, bicarbonate: bicarbonate)).Picture().AcidBase, StringComparison.Ordinal);

    [Fact]
    public void AcidBase_OfAChronicRetainer_ExpectsTheKidneysAnswer()
    {
        // PCO2 60: bicarbonate 31–34 expected after days; 26 is below that.
        var chart = new Chart().With(Chart.Aprv(), Chart.Gas(pH: 7.25m, pCO2: 60, bicarbonate: 26)).InContext(Circumstance.ChronicRetainer);

        Assert.Contains("Bicarbonate is lower than expected for this PaCO2 (31.0–34.0 mmol/L)", chart.Picture().AcidBase);
    }

    [Fact]
    public void AcidBase_WithoutAPrintedBicarbonate_UsesTheComputedOne() =>
        Assert.Contains("bicarbonate 14.4 mmol/L", new Chart().With(Chart.Aprv(), Chart.Gas(pH: 7.30m, pCO2: 30, bicarbonate: null)).Picture().AcidBase);

    [Fact]
    public void AcidBase_OfAnOldOrVenousGas_IsNotRead()
    {
        Assert.Null(new Chart().With(Chart.Aprv(900), Chart.Gas(721)).Picture().AcidBase);
        Assert.Null(new Chart().With(Chart.Aprv(), Chart.Gas() with { Specimen = Specimen.Venous }).Picture().AcidBase);
    }

    public static TheoryData<decimal, double, string> PublishedClasses => new()
    {
        { 150.5m, 0, "better than the mild range" },
        { 150, 1, "mild range" },
        { 100.5m, 1, "mild range" },
        { 100, 2, "moderate range" },
        { 50.5m, 2, "moderate range" },
        { 50, 3, "severe range" },
    };

    /// <summary>P/F 301, 300, 201, 200, 101 and 100 mmHg at FiO2 0.5.</summary>
    [Theory, MemberData(nameof(PublishedClasses))]
    public void OxygenationClass_OnBothSidesOfItsLimits(decimal pO2, double expected, string word)
    {
        var value = new Chart().With(Chart.Aprv(), Chart.Gas(pO2: pO2)).Picture()[ValueNames.OxygenationClass];

        Assert.Equal((expected, word), (value.Value, value.Word));
    }

    /// <summary>The limits × 630 ÷ 760 (from memory: earlier ARDS Network trials): 300 → 248.7.</summary>
    [Theory]
    [InlineData(124, "mild range")]
    [InlineData(125, "better than the mild range")]
    public void OxygenationClass_InTheMountains_ScalesItsLimits(int pO2, string word)
    {
        var chart = new Chart().With(Chart.Aprv(), Chart.Gas(pO2: pO2));
        chart.Unit = chart.Unit with { AltitudeM = 1549 }; // 630 mmHg in the standard atmosphere

        Assert.Equal(word, chart.Picture()[ValueNames.OxygenationClass].Word);
    }

    [Fact]
    public void OxygenationClass_AtAPeepBelow5_IsNotGiven()
    {
        var value = new Chart().With(Chart.PressureControl() with { PeepCmH2O = 3 }, Chart.Gas()).Picture()[ValueNames.OxygenationClass];

        Assert.Equal(ValueState.Domain, value.State);
        Assert.Null(value.Word);
    }
}
