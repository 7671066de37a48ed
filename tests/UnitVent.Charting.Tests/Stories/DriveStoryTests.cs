using UnitVent.Charting.Entries;
using UnitVent.Charting.Rules;

namespace UnitVent.Charting.Tests.Stories;

public sealed class DriveStoryTests
{
    /// <summary>Sedation takes the own breathing away; a relaxant keeps what was said and asks for a gas; light again, all is over.</summary>
    [Fact]
    public void SedationDeepens_ARelaxantFollows_AndThePatientWakes()
    {
        var story = new Story(Family.Drive);

        story.At(0, [Chart.Aprv(), .. Round(-1, 2)]).Stands();
        story.At(4, Round(-2, 1.5m)).Stands();
        story.At(8, Round(-4, 0.2m)).Stands();
        story.At(11.9, Round(-4, 0.2m)).Stands();
        story.At(12.5, Round(-4, 0.2m)).Stands("R19a Caution");
        story.At(16, Round(-4, 0.2m)).Stands("R19a Caution", "R30 Advisory");
        story.At(17, new BedsideEvent { What = EventKind.RelaxantStart }).Stands("R19a Caution", "R20 Advisory", "R30 Advisory");
        story.At(18, Chart.Gas()).Stands("R19a Caution", "R30 Advisory");
        story.At(22, new BedsideEvent { What = EventKind.RelaxantStop }).Stands("R19a Caution", "R30 Advisory");
        story.At(24, Round(-1, 1.9m)).Stands();
    }

    /// <summary>Minute volume falls by a third before any gas is drawn; longer T high is another matter.</summary>
    [Fact]
    public void MinuteVolumeFalls_WithoutAGas()
    {
        var story = new Story(Family.Drive);

        story.At(0, Chart.Aprv(), Total(9)).Stands();
        story.At(4, Total(8.8m)).Stands();
        story.At(7, Total(6)).Stands("R53 Caution");
        story.At(9, Total(7)).Stands("R53 Caution");
        story.At(10, Total(7.8m)).Stands();
        story.At(12, Chart.Aprv(tHigh: 6), Total(5.4m)).Stands();
    }

    private static Entry[] Round(int rass, decimal ownLitresPerMin) =>
        [new BreathingCheck { Rass = rass }, Chart.Check() with { SpontaneousMinuteVolumeLMin = ownLitresPerMin }];

    private static VentilatorCheck Total(decimal litresPerMin) => Chart.Check() with { TotalMinuteVolumeLMin = litresPerMin };
}
