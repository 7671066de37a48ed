namespace UnitVent.Simulation.Demo;

/// <summary>The part of a story that comes back for ever once it has been told, so that there is something to see whenever it is looked at.</summary>
internal sealed record Repetition
{
    public required double FromHour { get; init; }

    public required double EveryHours { get; init; }

    /// <summary>The hour of the story at a time since the start.</summary>
    public double StoryHour(double hour) => hour < FromHour ? hour : FromHour + ((hour - FromHour) % EveryHours);

    /// <summary>The minutes at which something comes up that the story has at one hour, up to a limit.</summary>
    public IEnumerable<int> Occurrences(int minute, int lastMinute)
    {
        var step = minute >= FromHour * 60 ? (int)Math.Round(EveryHours * 60) : int.MaxValue;
        for (long at = minute; at <= lastMinute; at += step)
        {
            yield return (int)at;
        }
    }
}
