using NodaTime;
using UnitVent.Charting.Entries;
using UnitVent.Physiology;
using UnitVent.Simulation.Demo;
using UnitVent.Simulation.Randomness;
using UnitVent.Simulation.Staff;

namespace UnitVent.Simulation.Cohort;

/// <summary>One patient of the study: every second one slips, in turn in each of the eight ways.</summary>
internal sealed class CohortPatient
{
    public const int Hours = 72;
    private const double EarliestPlanted = 20; // a day of charting to compare with, but for the last hours
    private const double LatestPlanted = 48; // time for the slowest to run its course, and to be found

    private readonly KeyedRandom random;

    public CohortPatient(int number, KeyedRandom study, BarometricPressure barometric)
    {
        (Number, random) = (number, study.For(number));
        var draw = new Draw(random.For("patient"));
        Planted = number % 2 == 0 ? (Deterioration)(number / 2 % Enum.GetValues<Deterioration>().Length) : null;
        var stable = new StablePatient(draw);
        var lung = stable.Lung(barometric);
        var hour = Math.Round(draw.Between("planted", EarliestPlanted, LatestPlanted), 1);
        var script = Planting.Script(Planted, stable.Settings, hour);
        Plan = new StudyPlan(script, random, Hours * 60);
        PlantedHour = Planted == Deterioration.BicarbonateSlip ? Plan.GasMinutes.First(m => m >= hour * 60) / 60.0 : hour;
        Scenario = new Scenario
        {
            Story = Planted?.ToString() ?? "Nothing happens.",
            Bed = $"{number + 1}",
            Patient = stable.Facts(number),
            Lung = lung,
            Course = Planting.Course(Planted, lung, hour),
            Bedside = Bedside,
            Charting = new ChartingHabits { MinutesBetweenRounds = 0, RoundsPerGas = 0 }, // the plan of the study stands in for them
            Script = script,
            Slips = Planted == Deterioration.BicarbonateSlip ? [SlipAt(PlantedHour, draw)] : [],
            Repeat = new Repetition { FromHour = Hours + 1, EveryHours = 1 },
        };
    }

    public int Number { get; }

    public Deterioration? Planted { get; }

    public double PlantedHour { get; }

    public StudyPlan Plan { get; }

    public Scenario Scenario { get; }

    private static Bedside Bedside { get; } = new()
    {
        Airway = AirwayKind.Oral,
        TubeSizeMm = 8.0m,
        TubeDepthCm = 23,
        TubeFixedAt = "corner of the mouth",
        Humidifier = Humidifier.Heated,
        Effort = Effort.Easy,
        Cough = Cough.Strong,
        Secretions = Secretions.Few,
        Vasopressor = Vasopressor.None,
    };

    /// <summary>What was charted in the three days.</summary>
    public SimulatedEpisode Tell(BarometricPressure barometric, Instant start)
    {
        var wander = new SlowWander(random.For("wander"), Plan.CheckMinutes);
        return new EpisodeTeller(Scenario, random, barometric, start, Plan.Until, wander.Of).Tell(start, start + Duration.FromHours(Hours));
    }

    private static BicarbonateSlip SlipAt(double hour, Draw draw) => new()
    {
        FromHour = hour - 0.01,
        ToHour = hour + 0.01,
        OffMmolL = draw.OneOf("slip", -7m, 7m),
    };
}
