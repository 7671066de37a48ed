using UnitVent.Charting.Rules;

namespace UnitVent.Charting.Tests.Stories;

public sealed class CirculationStoryTests
{
    /// <summary>Blood pressure falls on a high mean airway pressure; it must be well over the edge before it is over.</summary>
    [Fact]
    public void BloodPressureFalls_AndRecovers()
    {
        var story = new Story(Family.Circulation);

        story.At(0, Chart.Aprv(high: 20), Chart.Check(map: 62)).Stands();
        story.At(1, Chart.Aprv(high: 30), Chart.Check(map: 75)).Stands();
        story.At(2, Chart.Check(map: 62)).Stands("R47 Caution");
        story.At(3, Chart.Check(map: 58)).Stands("R47 Urgent");
        story.At(4, Chart.Check(map: 61)).Stands("R47 Caution");
        story.At(5, Chart.Check(map: 66)).Stands("R47 Caution");
        story.At(14).Stands("R47 Caution");
        story.At(15, Chart.Check(map: 70)).Stands();
    }
}
