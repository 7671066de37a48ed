using UnitVent.Charting.Entries;
using UnitVent.Simulation.Lung;

namespace UnitVent.Simulation.Demo;

/// <summary>What would make a story jump or stand still where its file can be read.</summary>
internal static class ScenarioCheck
{
    private const double Seamless = 1e-6;

    public static IEnumerable<string> Faults(Scenario scenario)
    {
        var end = scenario.Repeat.FromHour + scenario.Repeat.EveryHours;
        if (!scenario.Script.Any(s => s.Kind == EntryKind.SettingChange && s.Hour < 1))
        {
            yield return "The script has no settings within the first hour.";
        }

        if (scenario.Repeat.EveryHours <= 0 || scenario.Script.Any(s => s.Hour < 0 || s.Hour >= end))
        {
            yield return $"The script has to lie between hour 0 and hour {end}, where the story repeats.";
        }

        if (scenario.Course.Tracks().Any(t => t.Zip(t.Skip(1)).Any(pair => pair.First.Hour >= pair.Second.Hour)))
        {
            yield return "The hours of a track have to rise.";
        }

        if (scenario.Course.Tracks().Any(t => Math.Abs(Keyframe.At(t, scenario.Repeat.FromHour) - Keyframe.At(t, end)) > Seamless))
        {
            yield return $"A track has to be back at hour {end} where it was at hour {scenario.Repeat.FromHour}.";
        }
    }
}
