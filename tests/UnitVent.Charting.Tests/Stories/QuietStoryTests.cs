using UnitVent.Charting.Entries;
using UnitVent.Charting.Rules;

namespace UnitVent.Charting.Tests.Stories;

/// <summary>Nothing goes quiet because someone is late, a number is doubted, or someone tapped seen; and nothing is said that the patient's circumstances explain.</summary>
public sealed class QuietStoryTests
{
    [Fact]
    public void ReadingsFallOverdue_TheOpenCardStays_UntilSomebodyLooks()
    {
        var story = new Story(Family.Timing, Family.Due);

        // R51 is for the due list: a complete baseline was not charted.
        story.At(0, Chart.Aprv(), Chart.Gas(), Chart.Check(peak: 100, end: 40)).Stands("R01 Caution", "R51 Information");
        story.At(5).Stands("R01 Caution", "R32 Advisory", "R51 Information");
        story.At(8.1).Stands("R01 Caution", "R17 Advisory", "R32 Caution", "R51 Information");
        story.At(9, Chart.Check(peak: 100, end: 58)).Stands("R51 Information");
    }

    [Fact]
    public void UrgentGas_ThatDoesNotFitItself_IsSaidAsUnconfirmed_AndTheRepeatDecides()
    {
        var story = new Story(Family.CarbonDioxide, Family.Entry);

        story.At(0, Chart.Aprv(), Chart.Gas(pH: 7.38m, pCO2: 44, bicarbonate: 25.5m)).Stands();
        story.At(4, Chart.Gas(pH: 7.12m, pCO2: 46, bicarbonate: 25.5m)).Stands("R14 Caution", "R21 Urgent", "R22 Urgent").Says("R22", "unconfirmed: pH 7.12 does not fit");
        story.At(4.2, Chart.Gas(pH: 7.37m, pCO2: 45, bicarbonate: 25.4m)).Stands();
    }

    [Fact]
    public void TakenInHand_AndStillTrue_IsOpenAgainWhenTheHourIsOver_OrAtOnceWhenItIsWorse()
    {
        var story = new Story(Family.Oxygen);

        story.At(0, Chart.Aprv(), Chart.Check(spO2: 86)).Stands("R25 Urgent");
        story.TakenInHand(0.1, "R25").At(0.5, Chart.Check(spO2: 86)).Stands("R25 Urgent").IsInHand("R25", true);
        story.At(1.2).Stands("R25 Urgent").IsInHand("R25", false);
        story.TakenInHand(1.3, "R25").At(1.5, Chart.Check(spO2: 83)).Stands("R25 Urgent").IsInHand("R25", false);
        story.At(2, Chart.Check(spO2: 93)).Stands();
    }

    [Fact]
    public void ProneTurn_BeginsANewEpoch_InWhichTheOldOxygenIsNoReference()
    {
        var story = new Story(Family.Collapse);

        story.At(0, Chart.Aprv(), Chart.Gas(pO2: 75)).Stands();
        story.At(4, new BedsideEvent { What = EventKind.Prone }).At(6, Chart.Gas(pO2: 100)).Stands();
        story.At(20, new BedsideEvent { What = EventKind.Supine }).At(22, Chart.Gas(pO2: 74)).Stands();
        story.At(26, Chart.Gas(pO2: 58)).Stands("R24 Urgent");
    }

    [Fact]
    public void ChronicRetainer_IsHeldAgainstTheirOwnUsualPaCO2()
    {
        var story = new Story(Family.CarbonDioxide);

        story.At(0, Chart.Aprv(), new ContextChange { Flag = Circumstance.ChronicRetainer }, Chart.Gas(pH: 7.36m, pCO2: 61, bicarbonate: 34)).Stands();
        story.At(6, Chart.Gas(pH: 7.35m, pCO2: 62, bicarbonate: 33.7m)).Stands();
        story.At(12, Chart.Gas(pH: 7.28m, pCO2: 75, bicarbonate: 34.6m)).Stands("R21 Caution", "R23 Advisory");
    }

    [Fact]
    public void ComfortCare_KeepsDistress_AndNothingElse()
    {
        var story = new Story(Family.Oxygen, Family.Due, Family.CarbonDioxide, Family.Effort);

        story.At(0, Chart.Aprv(), new ContextChange { Flag = Circumstance.ComfortCare }, Chart.Check(spO2: 80), Chart.Gas(pH: 7.15m, pCO2: 80, pO2: 45, bicarbonate: null)).Stands();
        story.At(2, new BreathingCheck { Rass = 2, Effort = Effort.Strong, SpontaneousRatePerMin = 38 }).Stands("R19c Caution", "R30b Caution");
        story.At(30).Stands("R19c Caution", "R30b Caution");
    }

    [Fact]
    public void Ecmo_MutesWhatTheCircuitDoes_AndKeepsItsOwnBands()
    {
        var story = new Story(Family.Collapse, Family.Oxygen, Family.VolumeAndPressure);

        story.At(0, Chart.Aprv(), new ContextChange { Flag = Circumstance.EcmoVv }, Chart.Check(spO2: 95), Chart.Gas(pO2: 90)).Stands();
        story.At(4, Chart.Check(spO2: 84, release: 860), Chart.Gas(pO2: 50)).Stands();
        story.At(6, Chart.Check(spO2: 79)).Stands("R25 Urgent");
    }

    [Fact]
    public void SuddenChange_IsSaidAtOnce_AndStaysUntilACheckShowsOtherwise()
    {
        var story = new Story(Family.Sudden);

        story.At(0, Chart.Aprv(), Chart.Check(spO2: 95, map: 80)).Stands();
        story.At(2, Chart.Check(spO2: 86, map: 58, release: 240)).Stands("R56 Urgent");
        story.At(3).Stands("R56 Urgent");
        story.At(4, Chart.Check(spO2: 95, map: 78)).Stands();
    }
}
