using UnitVent.Charting.Entries;
using UnitVent.Charting.Rules;

namespace UnitVent.Charting.Tests.Stories;

public sealed class CarbonDioxideStoryTests
{
    /// <summary>Own breaths fall away; the rise stays said until the gas is back, and a venous gas neither calms nor replaces an arterial one.</summary>
    [Fact]
    public void CarbonDioxideRises_AVenousGasComes_AndItFallsAgain()
    {
        var story = new Story(Family.CarbonDioxide);

        story.At(0, Chart.Aprv(), Gas(44, 7.38m)).Stands();
        story.At(4, Gas(46, 7.37m)).Stands();
        story.At(8, Gas(57, 7.27m)).Stands("R21 Caution");
        story.At(9, Gas(62, 7.18m) with { Specimen = Specimen.Venous }).Stands("R21 Caution", "R57 Caution");
        story.At(9.5, Gas(63, 7.19m)).Stands("R21 Urgent", "R22 Urgent", "R23 Advisory");
        story.At(12, Gas(53, 7.31m)).Stands("R21 Urgent");
        story.At(16, Gas(46, 7.37m)).Stands();
    }

    /// <summary>A higher PaCO2 is accepted, so pH 7.22 is not said; once base excess falls it is, however much is accepted.</summary>
    [Fact]
    public void HigherPaCO2IsAccepted_UntilTheCauseIsMetabolic()
    {
        var story = new Story(Family.CarbonDioxide);

        story.At(0, Chart.Aprv(), new ContextChange { Flag = Circumstance.PermissiveHypercapnia }, Gas(68, 7.24m)).Stands("R23 Advisory");
        story.At(6, Gas(70, 7.22m)).Stands("R23 Advisory");
        story.At(12, Gas(50, 7.19m)).Stands("R22 Urgent");
    }

    /// <summary>A repeat six minutes later stands for the gas before it; it is no reference and no second witness.</summary>
    [Fact]
    public void RepeatAfterSixMinutes_TakesBackWhatTheMixedUpGasSaid()
    {
        var story = new Story(Family.CarbonDioxide);

        story.At(0, Chart.Aprv(), Gas(44, 7.38m)).Stands();
        story.At(4, Gas(58, 7.27m)).Stands("R21 Caution");
        story.At(4.1, Gas(45, 7.37m)).Stands();
    }

    private static BloodGas Gas(decimal pCO2, decimal pH) => Chart.Gas(pCO2: pCO2, pH: pH, bicarbonate: null);
}
