using UnitVent.Charting.Rules;

namespace UnitVent.Charting.Tests.Stories;

public sealed class CollapseStoryTests
{
    /// <summary>P high is lowered without a word and oxygen follows; once it is restored the fall stands until SpO2 is back.</summary>
    [Fact]
    public void PressureLowered_OxygenFalls_AndComesBack()
    {
        var story = new Story(Family.Collapse);

        story.At(0, Chart.Aprv(), Chart.Check(spO2: 96)).Stands();
        story.At(4, Chart.Check(spO2: 96)).Stands();
        story.At(8, Chart.Aprv(high: 25)).Stands("R34 Advisory");
        story.At(10, Chart.Check(spO2: 92)).Stands("R34 Advisory", "R54 Caution");
        story.At(11, Chart.Aprv()).Stands("R54 Caution");
        story.At(12.5, Chart.Check(spO2: 93)).Stands("R54 Caution");
        story.At(14, Chart.Check(spO2: 95)).Stands();
    }

    /// <summary>The lung stiffens at the same pressures and oxygen goes with it, slowly; no single value is a step. After P high was raised stiffness waits for four checks at the new pressures.</summary>
    [Fact]
    public void LungStiffens_OxygenFollows()
    {
        var story = new Story(Family.Collapse);

        story.At(0, Chart.Aprv(), Chart.Gas(pO2: 90), Chart.Check(release: 440)).Stands();
        story.At(4, Chart.Gas(pO2: 91), Chart.Check(release: 435)).Stands();
        story.At(8, Chart.Gas(pO2: 87), Chart.Check(release: 410)).Stands();
        story.At(12, Chart.Gas(pO2: 80), Chart.Check(release: 380)).Stands();
        story.At(16, Chart.Gas(pO2: 74), Chart.Check(release: 345)).Stands("R05 Advisory", "R09 Caution", "R24 Caution");
        story.At(20, Chart.Aprv(high: 31), Chart.Check(release: 400)).Stands("R05 Advisory", "R09 Caution", "R24 Caution");
        story.At(24, Chart.Gas(pO2: 88), Chart.Check(release: 455)).Stands("R09 Caution");
        story.At(28, Chart.Gas(pO2: 92), Chart.Check(release: 460)).Stands("R09 Caution");
        story.At(32, Chart.Check(release: 462)).Stands();
    }
}
