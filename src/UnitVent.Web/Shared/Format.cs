using NodaTime;
using NodaTime.Text;
using UnitVent.Charting.Wording;

namespace UnitVent.Web.Shared;

/// <summary>Numbers and times as screens write them.</summary>
public static class Format
{
    private static readonly LocalTimePattern Clock = LocalTimePattern.CreateWithInvariantCulture("HH:mm");
    private static readonly LocalDatePattern Day = LocalDatePattern.CreateWithInvariantCulture("ddd d MMM");
    private static readonly LocalDatePattern DayOfYear = LocalDatePattern.CreateWithInvariantCulture("ddd d MMM uuuu");
    private static readonly LocalDatePattern Date = LocalDatePattern.CreateWithInvariantCulture("d MMM uuuu");

    /// <summary>A number with fixed decimals; an en dash when there is none.</summary>
    public static string Number(double? value, int decimals) => value is { } known ? Numbers.Fixed(known, decimals) : "–";

    /// <summary>A number exactly as it was typed; an en dash when there is none.</summary>
    public static string Typed(decimal? value) => value is { } known ? Numbers.Typed(known) : "–";

    /// <summary>The time of day in a zone, with the day when it is not today, and the year when it is not this year.</summary>
    public static string Time(Instant at, Instant now, DateTimeZone zone)
    {
        var (then, today) = (at.InZone(zone), now.InZone(zone).Date);
        var clock = Clock.Format(then.TimeOfDay);
        return then.Date == today ? clock : $"{(then.Year == today.Year ? Day : DayOfYear).Format(then.Date)} {clock}";
    }

    /// <summary>How long ago, in the two largest units that matter: <c>2 h 10 min ago</c>.</summary>
    public static string Ago(Instant at, Instant now) => now - at < Duration.FromMinutes(1) ? "just now" : Length(now - at) + " ago";

    /// <summary>A length of time in the two largest units that matter: <c>2 h 10 min</c>.</summary>
    public static string Length(Duration length)
    {
        var (days, hours, minutes) = ((int)length.TotalDays, length.Hours, length.Minutes);
        return (days, hours, minutes) switch
        {
            (0, 0, _) => $"{minutes} min",
            (0, _, 0) => $"{hours} h",
            (0, _, _) => $"{hours} h {minutes} min",
            (_, 0, _) => $"{days} d",
            _ => $"{days} d {hours} h",
        };
    }

    public static string DateOf(LocalDate date) => Date.Format(date);
}
