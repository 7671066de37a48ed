using UnitVent.Charting.Entries;
using UnitVent.Charting.Pictures;
using UnitVent.Physiology;

namespace UnitVent.Charting.Rules;

/// <summary>The checks that rules about releases look at.</summary>
internal static class ReleaseChecks
{
    public const decimal LeakThatInvalidatesPercent = 30; // common practice

    public static IReadOnlyList<Charted<VentilatorCheck>> WithFlows(PatientPicture picture) =>
        [.. picture.Window.Of<VentilatorCheck>(EntryKind.VentilatorCheck, picture.AsOf)
            .Where(c => EndFlowPercent(c.Body) is not null)];

    /// <summary>End-release flow in % of peak; null when a flow is missing or the two do not belong together.</summary>
    public static double? EndFlowPercent(VentilatorCheck check) =>
        check is { PeakExpiratoryFlowLMin: { } peak, EndReleaseFlowLMin: { } end } && end < peak
            ? 100 * ReleaseTermination.Ratio(GasFlow.FromLitresPerMinute((double)peak), GasFlow.FromLitresPerMinute((double)end))
            : null;

    /// <summary>Whether the flows of a check were read from one release, or nobody says from how many.</summary>
    public static bool AreFew(VentilatorCheck check) => (check.FlowReadings ?? check.ReleasesAveraged ?? 1) < 2;

    /// <summary>Why the mechanics of a check are not valid; null when they are.</summary>
    public static string? NotValid(PatientPicture picture, Charted<VentilatorCheck> check) => NotValid(check.Body, picture.Has(Circumstance.AirLeak));

    /// <summary>Why the mechanics of a check are not valid; null when they are.</summary>
    public static string? NotValid(VentilatorCheck check, bool airLeak) =>
        check.EffortDuringRelease == true ? "Not valid: effort during the release."
        : airLeak || check.LeakPercent > LeakThatInvalidatesPercent ? "Not valid with a leak."
        : null;
}
