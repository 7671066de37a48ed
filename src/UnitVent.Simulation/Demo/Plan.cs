using UnitVent.Charting.Entries;
using UnitVent.Simulation.Randomness;

namespace UnitVent.Simulation.Demo;

/// <summary>When the staff comes to a bed: as the script says, in regular rounds, and to look at what a setting change did.</summary>
/// <remarks>Whether something is done at a minute never depends on how far the plan is drawn up.</remarks>
internal sealed class Plan(Scenario scenario, KeyedRandom random)
{
    private const int JitterMin = 8;
    private const int GasBeforeRoundMin = 14;
    private const int CheckAfterChangeMin = 25;
    private const int GasAfterChangeMin = 80; // past the hour in which oxygen and carbon dioxide still settle
    private const int RoundAfterChangeMin = 95;
    private const int QuietAfterChangeMin = 135; // no regular round, since the change has its own
    private const int GasQuietAfterChangeMin = 270;
    private const int LookAheadMin = 60; // a change soon after a gas may cancel the round that the gas belongs to

    /// <summary>Everything up to a minute, in order.</summary>
    public IReadOnlyList<PlannedMoment> Until(int lastMinute)
    {
        var scripted = scenario.Script.SelectMany((e, i) => Times(e, lastMinute + LookAheadMin).Select(m => new PlannedMoment.Scripted(m, i, e))).ToList();
        var changes = scripted.Where(s => s.Entry.Kind == EntryKind.SettingChange).Select(s => s.Minute).Order().ToArray();
        return [.. scripted.Concat(changes.SelectMany(AfterChange)).Concat(Rounds(changes, lastMinute))
            .Where(m => m.Minute <= lastMinute)
            .OrderBy(m => m.Minute)];
    }

    /// <summary>Follow-ups are told once, since nothing here marks them done.</summary>
    private IEnumerable<int> Times(ScriptedEntry entry, int lastMinute) =>
        entry.Kind == EntryKind.FollowUp ? [entry.Minute] : scenario.Repeat.Occurrences(entry.Minute, lastMinute);

    private static IEnumerable<PlannedMoment> AfterChange(int change) =>
    [
        new PlannedMoment.Round(change + CheckAfterChangeMin),
        new PlannedMoment.Gas(change + GasAfterChangeMin),
        new PlannedMoment.Round(change + RoundAfterChangeMin),
    ];

    private IEnumerable<PlannedMoment> Rounds(int[] changes, int lastMinute)
    {
        var (habits, jitter, next) = (scenario.Charting, random.For("rounds"), 0);
        for (var round = 1; round * habits.MinutesBetweenRounds - JitterMin <= lastMinute + GasBeforeRoundMin; round++)
        {
            var minute = (round * habits.MinutesBetweenRounds) + (int)Math.Round(JitterMin * ((2 * jitter.Uniform(round)) - 1));
            while (next < changes.Length && changes[next] <= minute)
            {
                next++;
            }

            var sinceChange = next == 0 ? int.MaxValue : minute - changes[next - 1];
            if (sinceChange <= QuietAfterChangeMin)
            {
                continue;
            }

            if (round % habits.RoundsPerGas == 0 && sinceChange > GasQuietAfterChangeMin)
            {
                yield return new PlannedMoment.Gas(minute - GasBeforeRoundMin);
            }

            yield return new PlannedMoment.Round(minute, round % habits.RoundsPerAirwayCheck == 0, round % habits.RoundsPerSuction == 0);
        }
    }
}
