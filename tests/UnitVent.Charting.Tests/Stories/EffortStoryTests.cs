using UnitVent.Charting.Entries;
using UnitVent.Charting.Rules;

namespace UnitVent.Charting.Tests.Stories;

public sealed class EffortStoryTests
{
    /// <summary>Distress is said in comfort care as well, and eases step by step.</summary>
    [Fact]
    public void PatientLabours_InComfortCareToo()
    {
        var story = new Story(Family.Effort);

        story.At(0, Chart.Aprv(), Breath(20, 300, Effort.Easy)).Stands();
        story.At(2, Breath(36, 320, Effort.Moderate)).Stands("R19c Caution");
        story.At(3, new ContextChange { Flag = Circumstance.ComfortCare }).Stands("R19c Caution");
        story.At(4, Breath(37, 600, Effort.Strong)).Stands("R19c Caution", "R19d Caution");
        story.At(6, Breath(34, 500, Effort.Strong)).Stands("R19c Caution");
        story.At(8, Breath(28, 400, Effort.Easy) with { Rass = 2 }).Stands("R30b Caution");
        story.At(16).Stands("R30b Caution");
        story.At(17, Breath(22, 350, Effort.Easy) with { Rass = 0 }).Stands();
    }

    private static BreathingCheck Breath(decimal rate, decimal millilitres, Effort effort) =>
        new() { SpontaneousRatePerMin = rate, SpontaneousTidalVolumeMl = millilitres, Effort = effort };
}
