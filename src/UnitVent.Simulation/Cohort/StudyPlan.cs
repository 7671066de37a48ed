using UnitVent.Simulation.Demo;
using UnitVent.Simulation.Randomness;

namespace UnitVent.Simulation.Cohort;

/// <summary>When the staff of the study comes: a check every 2 to 4 h, a gas every 4 to 6 h, each on its own.</summary>
internal sealed class StudyPlan
{
    private const int RoundsPerAirwayCheck = 4;

    private readonly IReadOnlyList<PlannedMoment> scripted;

    public StudyPlan(IReadOnlyList<ScriptedEntry> script, KeyedRandom random, int lastMinute)
    {
        scripted = [.. script.Select((entry, i) => new PlannedMoment.Scripted(entry.Minute, i, entry))];
        CheckMinutes = [.. Times(random.For("checks"), first: 20, least: 120, most: 240, lastMinute)];
        GasMinutes = [.. Times(random.For("gases"), first: 40, least: 240, most: 360, lastMinute)];
    }

    public IReadOnlyList<int> CheckMinutes { get; }

    public IReadOnlyList<int> GasMinutes { get; }

    public IReadOnlyList<PlannedMoment> Until(int lastMinute) =>
        [.. scripted
            .Concat(CheckMinutes.Select((m, i) => new PlannedMoment.Round(m, i % RoundsPerAirwayCheck == 0)))
            .Concat(GasMinutes.Select(m => new PlannedMoment.Gas(m)))
            .Where(m => m.Minute <= lastMinute)
            .OrderBy(m => m.Minute)];

    private static IEnumerable<int> Times(KeyedRandom random, int first, int least, int most, int lastMinute)
    {
        for (var (minute, i) = (first, 0); minute <= lastMinute; i++)
        {
            yield return minute;
            minute += least + (int)((most - least) * random.Uniform(i));
        }
    }
}
