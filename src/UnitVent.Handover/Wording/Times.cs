using NodaTime;
using NodaTime.Text;

namespace UnitVent.Handover.Wording;

/// <summary>Times as a sheet prints them: in the unit's zone, with the day when it is not the day of printing, and how long ago.</summary>
internal sealed class Times(DateTimeZone zone, Instant now)
{
    private static readonly LocalTimePattern Clock = LocalTimePattern.CreateWithInvariantCulture("HH:mm");
    private static readonly LocalDatePattern DayOfWeek = LocalDatePattern.CreateWithInvariantCulture("ddd\u00A0d\u00A0MMM");
    private static readonly LocalDatePattern FullDay = LocalDatePattern.CreateWithInvariantCulture("d\u00A0MMM\u00A0uuuu");

    public LocalDate Today => now.InZone(zone).Date;

    public static string Date(LocalDate date) => FullDay.Format(date);

    public static string WeekDay(LocalDate date) => DayOfWeek.Format(date);

    public string At(Instant at) => at.InZone(zone).Date == Today ? ClockTime(at) : OnDay(at);

    public string OnDay(Instant at) => $"{DayOfWeek.Format(at.InZone(zone).Date)}\u00A0{ClockTime(at)}";

    /// <summary>The time and how long ago: <c>14:05, 2 h ago</c>.</summary>
    public string AtAndAge(Instant at) => $"{At(at)}, {Length(now - at)} ago";

    /// <summary>How long since, in the largest unit that says it and the next below.</summary>
    public string Since(Instant at) => Length(now - at);

    public static string Length(Duration length) => length switch
    {
        { Days: > 0 } => Parts(length.Days, "d", length.Hours, "h"),
        { Hours: > 0 } => Parts(length.Hours, "h", length.Minutes, "min"),
        _ => $"{length.Minutes}\u00A0min",
    };

    private static string Parts(int large, string largeUnit, int small, string smallUnit) =>
        small == 0 ? $"{large}\u00A0{largeUnit}" : $"{large}\u00A0{largeUnit}\u00A0{small}\u00A0{smallUnit}";

    private string ClockTime(Instant at) => Clock.Format(at.InZone(zone).TimeOfDay);
}
