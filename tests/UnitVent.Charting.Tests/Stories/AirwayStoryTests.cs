using UnitVent.Charting.Entries;
using UnitVent.Charting.Rules;

namespace UnitVent.Charting.Tests.Stories;

public sealed class AirwayStoryTests
{
    /// <summary>The lung empties more and more slowly, at first not surely; one better check after suction makes it less sure, two end it.</summary>
    [Fact]
    public void AirwayNarrows_ThenIsCleared()
    {
        var story = new Story(Family.Airway);

        story.At(0, Chart.Aprv(), Flow(60)).Stands();
        story.At(2, Flow(61)).Stands();
        story.At(4, Flow(60)).Stands();
        story.At(6, Flow(63)).Stands();
        story.At(8, Flow(66)).Stands();
        story.At(10, Flow(69)).Stands("R59 Advisory");
        story.At(12, Flow(72)).Stands("R59 Caution");
        story.At(13, new BedsideEvent { What = EventKind.Suction }).Stands("R59 Caution");
        story.At(14, Flow(61)).Stands("R59 Advisory");
        story.At(16, Flow(60)).Stands();
    }

    private static VentilatorCheck Flow(decimal endPercent) => Chart.Check(peak: 100, end: endPercent);
}
