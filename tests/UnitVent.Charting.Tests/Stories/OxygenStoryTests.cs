using UnitVent.Charting.Rules;

namespace UnitVent.Charting.Tests.Stories;

public sealed class OxygenStoryTests
{
    /// <summary>SpO2 slips point by point, FiO2 creeps after it, and nothing of it is over before SpO2 is back and FiO2 down.</summary>
    [Fact]
    public void SaturationSlips_FiO2Creeps_AndBothComeBack()
    {
        var story = new Story(Family.Oxygen);

        story.At(0, Chart.Aprv(fiO2: 0.4m), Chart.Check(spO2: 96)).Stands();
        story.At(4, Chart.Check(spO2: 95)).Stands();
        story.At(8, Chart.Check(spO2: 94)).Stands();
        story.At(12, Chart.Check(spO2: 93)).Stands("R58 Caution");
        story.At(12.2, Chart.Aprv(fiO2: 0.5m)).Stands("R58 Caution");
        story.At(14, Chart.Aprv(fiO2: 0.6m)).Stands("R55 Caution", "R58 Caution");
        story.At(15, Chart.Check(spO2: 96)).Stands("R55 Caution", "R58 Caution");
        story.At(18, Chart.Aprv(fiO2: 0.45m)).Stands("R55 Caution", "R58 Caution");
        story.At(19, Chart.Check(spO2: 96)).Stands();
    }

    /// <summary>More oxygen than is aimed at is said after two hours, not at once, and is over with the next reading inside.</summary>
    [Fact]
    public void OxygenAboveTarget_IsSaidAfterTwoHours()
    {
        var story = new Story(Family.Oxygen);

        story.At(0, Chart.Aprv(), Chart.Check(spO2: 98)).Stands();
        story.At(1, Chart.Check(spO2: 98)).Stands();
        story.At(2, Chart.Check(spO2: 98)).Stands("R26 Advisory");
        story.At(3, Chart.Check(spO2: 95)).Stands();
    }
}
