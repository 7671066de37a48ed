using UnitVent.Charting.Entries;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Trends;

namespace UnitVent.Charting.Rules.Drive;

/// <summary>For how long checks show little own breathing.</summary>
internal static class LowShare
{
    /// <summary>Whether the youngest reading may be low: cheap, and asked before the checks are gone through.</summary>
    public static bool MayBe(PatientPicture picture, double underPercent) =>
        picture[ValueNames.SpontaneousSharePercent].Value < underPercent || NoOwnRate(picture.Check?.Body);

    /// <summary>The latest checks in a row whose own share lies under a limit in per cent, the youngest first.</summary>
    public static IReadOnlyList<SeriesPoint> Run(PatientPicture picture, double underPercent) =>
        [.. Shares(picture).Reverse().TakeWhile(p => p.Value < underPercent)];

    /// <summary>How far the share fell: the youngest of a run against the median of the 12 h before the run; null without checks before it.</summary>
    public static Step? Fall(PatientPicture picture, IReadOnlyList<SeriesPoint> run) =>
        Step.Of(Shares(picture).Where(p => p.At < run[^1].At && run[^1].At - p.At <= Step.Reach), run[^1]) is { } step ? step with { After = run[0].Value } : null;

    // Without own breaths the share is zero, whatever the difference of two volumes says.
    private static IEnumerable<SeriesPoint> Shares(PatientPicture picture) =>
        picture.Series.OfChecks(c => NoOwnRate(c.Check.Body) ? 0 : c[ValueNames.SpontaneousSharePercent]?.Value);

    private static bool NoOwnRate(VentilatorCheck? check) => check is { SpontaneousRatePerMin: 0m };
}
