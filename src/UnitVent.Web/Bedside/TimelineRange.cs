using NodaTime;
using UnitVent.Charting.Pictures;
using UnitVent.Web.Board;

namespace UnitVent.Web.Bedside;

/// <summary>How much time the timeline shows.</summary>
/// <param name="Label">The words on the screen.</param>
/// <param name="From">The first instant.</param>
public sealed record TimelineRange(string Label, Func<PatientPicture, Instant> From)
{
    public static IReadOnlyList<TimelineRange> All { get; } =
    [
        new("Shift", ShiftChanges.Began),
        new("24 h", p => p.AsOf - Duration.FromHours(24)),
        new("3 d", p => p.AsOf - Duration.FromDays(3)),
        new("Whole episode", p => Instant.Min(p.Window.Episode.AirwaySecuredAt, p.Window.Episode.AdmittedAt)),
    ];

    public static TimelineRange Day => All[1];
}
