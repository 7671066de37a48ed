using NodaTime;

namespace UnitVent.Charting.Trends;

/// <summary>What came of a setting change (B3): the first settled value after it against the median of the settings epoch before it.</summary>
/// <param name="Step">Before and after.</param>
/// <param name="AfterChange">The time from the change to the value.</param>
public sealed record SettingStep(Step Step, Duration AfterChange)
{
    private static readonly Duration SameMinute = Duration.FromMinutes(1);

    /// <summary>What came of a change; a value of the same minute belongs to the settings before it; null when either side has no valid value.</summary>
    /// <param name="series">The valid values.</param>
    /// <param name="changedAt">When the settings were changed.</param>
    /// <param name="changedBefore">When they were changed the time before; null when they never were.</param>
    /// <param name="settling">How long after the change a value says nothing about the new settings yet.</param>
    public static SettingStep? Of(IReadOnlyList<SeriesPoint> series, Instant changedAt, Instant? changedBefore, Duration settling)
    {
        var after = series.Where(p => p.At >= changedAt + Duration.Max(settling, SameMinute)).OrderBy(p => p.At).Take(1).ToList();
        var epoch = changedBefore + SameMinute ?? Instant.MinValue;
        var before = series.Where(p => p.At < changedAt + SameMinute && p.At >= epoch && changedAt - p.At <= Step.Reach);
        return after.Count == 1 && Step.Of(before.Select(p => p with { At = Instant.Max(p.At, after[0].At - Step.Reach) }), after[0]) is { } step
            ? new(step, after[0].At - changedAt)
            : null;
    }
}
