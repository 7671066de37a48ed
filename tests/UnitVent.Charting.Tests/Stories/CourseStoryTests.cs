using UnitVent.Charting.Entries;
using UnitVent.Charting.Rules;

namespace UnitVent.Charting.Tests.Stories;

/// <summary>Stories of the families that go with the course: volume and pressure, entry, due, step-down, liberation.</summary>
public sealed class CourseStoryTests
{
    [Fact]
    public void PlateauRises_AndIsSaidUntilItIsClearlyInside()
    {
        var story = new Story(Family.VolumeAndPressure);

        story.At(0, Chart.PressureControl(), Plateau(28)).Stands("R43 Advisory");
        story.At(4, Plateau(31)).Stands("R42 Caution", "R43 Advisory");
        story.At(8, Plateau(30)).Stands("R42 Caution", "R43 Advisory");
        story.At(10, Plateau(40) with { Passive = false }).Stands("R42 Caution", "R43 Advisory");
        story.At(12, Plateau(24)).Stands();
    }

    [Fact]
    public void MeanPressureDoesNotGoWithTheSettings_UntilTheyAreCharted()
    {
        var story = new Story(Family.Entry);

        story.At(0, Chart.Aprv(), Mean(25.7m)).Stands();
        story.At(4, Mean(21)).Stands("R13 Advisory");
        story.At(4.2, Chart.Aprv(high: 23)).Stands("R13 Advisory");
        story.At(8, Mean(21)).Stands();
    }

    [Fact]
    public void SettingChange_WithoutAGas_FallsDue_AndTransportSilencesNothingThatWasSaid()
    {
        var story = new Story(Family.Due);
        BreathingCheck breathing = new() { Rass = -1 };

        story.At(0, Chart.Aprv(), Chart.Gas(), Chart.Check(), breathing, new AirwayCheck()).Stands();
        story.At(1, Chart.Aprv(high: 25), Chart.Check()).Stands();
        story.At(3).Stands();
        story.At(3.1).Stands("R31 Advisory");
        story.At(4, new BedsideEvent { What = EventKind.TransportOut }).Stands("R31 Advisory");
        story.At(5.5, new BedsideEvent { What = EventKind.TransportBack }, Chart.Check()).Stands("R31 Caution");
        story.At(6, Chart.Gas()).Stands();
    }

    [Fact]
    public void StepDown_WithTooLittleTHigh_IsSaidUntilItIsLonger()
    {
        var story = new Story(Family.StepDown);

        story.At(0, Chart.Aprv(high: 24)).Stands();
        story.At(4, Chart.Aprv(high: 22)).Stands("R35 Advisory");
        story.At(5, Chart.Aprv(high: 22, tHigh: 5.5m)).Stands();
        story.At(9, Chart.Aprv(high: 18, tHigh: 7.5m)).Stands("R36 Advisory");
        story.At(21.5).Stands();
    }

    /// <summary>Admission to the story is at noon; hour 19 is seven in the morning.</summary>
    [Fact]
    public void MorningScreen_ATrialBegins_AndItsOutcomeIsMissed()
    {
        var story = new Story(Family.Liberation);
        var support = new SettingChange { Mode = VentilationMode.PressureSupport, PressureSupportCmH2O = 8, PeepCmH2O = 6, FiO2 = 0.35m };

        story.At(1, support).Stands();
        story.At(19, Chart.Gas(fiO2: 0.35m), Chart.Check(spO2: 95) with { Vasopressor = Vasopressor.None }, new BreathingCheck { Rass = 0, Effort = Effort.Easy }).Stands("R38 Information");
        story.At(20, new BedsideEvent { What = EventKind.BreathingTrialStart }).Stands();
        story.At(21, support with { FiO2 = 0.45m }).Stands("R40 Advisory");
        story.At(22.6).Stands("R39 Advisory", "R40 Advisory");
        story.At(23, new BedsideEvent { What = EventKind.BreathingTrialResult, Result = TrialResult.Failed }).Stands();
        story.At(43, Chart.Gas(fiO2: 0.35m), Chart.Check(spO2: 95) with { Vasopressor = Vasopressor.None }, new BreathingCheck { Rass = 0, Effort = Effort.Easy }).Stands();
    }

    private static VentilatorCheck Plateau(decimal cmH2O) =>
        Chart.Check(release: null, peak: null, end: null) with { TidalVolumeMl = 400, PlateauPressureCmH2O = cmH2O, Passive = true, HoldS = 0.5m };

    private static VentilatorCheck Mean(decimal cmH2O) => Chart.Check() with { MeanAirwayPressureCmH2O = cmH2O };
}
