using UnitVent.Charting.Entries;
using UnitVent.Charting.Rules;

namespace UnitVent.Charting.Tests.Stories;

public sealed class TimingStoryTests
{
    /// <summary>A release that ends early is said once the gas shows it; after T low was lengthened too far the other edge is, and the fall still when it has passed the edge.</summary>
    [Fact]
    public void ReleaseEndsEarly_ThenLate()
    {
        var story = new Story(Family.Timing);

        story.At(0, Chart.Aprv(), Flow(60)).Stands();
        story.At(4, Flow(78), PH(7.34m)).Stands();
        story.At(5, PH(7.28m)).Stands("R02 Advisory");
        story.At(6, PH(7.23m)).Stands("R02 Caution");
        story.At(8, Chart.Aprv(tLow: 0.6m), Flow(71)).Stands("R02 Caution");
        story.At(9, Flow(65)).Stands();
        story.At(10, Chart.Aprv(tLow: 0.8m), Flow(40)).Stands("R01 Caution");
        story.At(17).Stands("R01 Caution");
        story.At(18, Chart.Aprv(tLow: 0.7m), Flow(48)).Stands("R01 Caution");
        story.At(20, Chart.Aprv(tLow: 0.6m), Flow(55)).Stands();
    }

    /// <summary>Without a flow T low itself is looked at; a flow that was read ends it.</summary>
    [Fact]
    public void NoFlowRecorded_ThenRead()
    {
        var story = new Story(Family.Timing);

        story.At(0, Chart.Aprv(tLow: 1.0m, tHigh: 4.5m)).Stands("R03 Advisory");
        story.At(2, Flow(55)).Stands();
        story.At(4, Chart.Aprv(tLow: 1.0m, tHigh: 3.5m), Flow(55)).Stands("R08 Advisory");
        story.At(6, Chart.Aprv(tLow: 1.0m, tHigh: 4.5m), Flow(55)).Stands();
    }

    private static VentilatorCheck Flow(decimal endPercent) => Chart.Check(peak: 100, end: endPercent);

    private static BloodGas PH(decimal pH) => Chart.Gas(pH: pH, bicarbonate: null);
}
