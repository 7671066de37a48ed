using NodaTime;

namespace UnitVent.Charting.Trends;

/// <summary>Values of the same quantity shortly after one another: never averaged; the latest stands [common practice].</summary>
internal static class Repeats
{
    private static readonly Duration Apart = Duration.FromMinutes(30);

    /// <summary>The points without those that a later one less than 30 min away stands for, oldest first. Of two at the same time the later in the list stands.</summary>
    public static IReadOnlyList<SeriesPoint> Dropped(IEnumerable<SeriesPoint> points)
    {
        List<SeriesPoint> standing = [];
        foreach (var point in points.OrderBy(p => p.At).Reverse())
        {
            if (standing.Count == 0 || standing[^1].At - point.At >= Apart)
            {
                standing.Add(point);
            }
        }

        standing.Reverse();
        return standing;
    }
}
