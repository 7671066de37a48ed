using UnitVent.Charting.Pictures;
using UnitVent.Charting.Trends;

namespace UnitVent.Charting.Rules.Drive;

/// <summary>For how long checks show little own breathing.</summary>
internal static class LowShare
{
    /// <summary>The latest checks in a row whose own share lies under a limit in per cent, the youngest first.</summary>
    public static IReadOnlyList<SeriesPoint> Run(PatientPicture picture, double underPercent) =>
        [.. picture.Series.OfChecks(c => c[ValueNames.SpontaneousSharePercent]?.Value).Reverse().TakeWhile(p => p.Value < underPercent)];
}
