using NodaTime;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Windows;

namespace UnitVent.Charting.Rules.Collapse;

/// <summary>Mean airway pressure by the settings fell within the last hours.</summary>
/// <param name="Before">The highest that was in force in that time, in cmH2O.</param>
/// <param name="After">What the settings in force make, in cmH2O.</param>
/// <param name="ChangedAt">When the highest ended.</param>
/// <param name="Latest">The latest setting change.</param>
internal sealed record MeanPressureFall(double Before, double After, Instant ChangedAt, Charted<SettingChange> Latest)
{
    /// <summary>The fall up to an instant; null when there was none in that time, or mean pressure cannot be computed.</summary>
    public static MeanPressureFall? Of(ChartWindow window, Instant at, Duration within)
    {
        var changes = window.Of<SettingChange>(EntryKind.SettingChange, at).ToList();
        if (changes.Count < 2 || at - changes[^1].At > within || Mean(changes[^1]) is not { } after)
        {
            return null;
        }

        MeanPressureFall? fall = null;
        for (var i = changes.Count - 2; i >= 0 && at - changes[i + 1].At <= within && changes[i].Body.Mode == changes[^1].Body.Mode; i--)
        {
            fall = Mean(changes[i]) is { } before && before > (fall?.Before ?? after) ? new(before, after, changes[i + 1].At, changes[^1]) : fall;
        }

        return fall;
    }

    /// <summary>Mean pressure by settings, in cmH2O; null when it cannot be computed from them alone.</summary>
    public static double? Mean(Charted<SettingChange> settings) => MeanPressure.Computed(settings, null).Value;
}
