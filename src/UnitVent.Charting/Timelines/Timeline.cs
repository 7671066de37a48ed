using NodaTime;
using UnitVent.Charting.Windows;

namespace UnitVent.Charting.Timelines;

/// <summary>The series behind the lanes of the timeline.</summary>
/// <param name="From">The first instant.</param>
/// <param name="To">The last instant.</param>
/// <param name="Series">The lines.</param>
/// <param name="Marks">What happened, oldest first.</param>
public sealed record Timeline(Instant From, Instant To, IReadOnlyList<TimelineSeries> Series, IReadOnlyList<TimelineMark> Marks)
{
    /// <summary>The timeline of a window that holds the entries of the range and the last of each kind before it.</summary>
    public static Timeline Of(ChartWindow window, Instant from, Instant to) => new(from, to, [], []);
}
