using System.Globalization;
using System.Text.RegularExpressions;
using NodaTime;
using UnitVent.Web.Shared;

namespace UnitVent.Web.Charting;

/// <summary>A typed time of day, resolved to an instant in the unit's zone, or the sentence that says why it cannot be.</summary>
/// <param name="At">The instant; null when there is none yet.</param>
/// <param name="Says">The day and age it resolved to, for the person who typed.</param>
/// <param name="Problem">What is wrong with it; null when nothing is.</param>
/// <param name="Choices">The two instants of a repeated hour between which a person has to choose; empty otherwise.</param>
public sealed partial record TypedTime(Instant? At, string Says, string? Problem, IReadOnlyList<Instant> Choices)
{
    private static readonly Duration Ahead = UnitVent.Charting.Checking.TimeCheck.Ahead;
    private static readonly Duration BackAcrossMidnight = Duration.FromHours(12);
    private static readonly string[] Months = ["jan", "feb", "mar", "apr", "may", "jun", "jul", "aug", "sep", "oct", "nov", "dec"];

    /// <summary>Resolves a time that has passed: 0540, 05:40, or with the day, 30 Nov 05:40. The time of day alone is the latest such time of the last 12 h.</summary>
    public static TypedTime Past(string text, Instant now, DateTimeZone zone, bool later = false) => Resolve(text, now, zone, later, PastDay);

    /// <summary>Resolves a time to come: the time of day alone is the next such time.</summary>
    public static TypedTime ToCome(string text, Instant now, DateTimeZone zone, bool later = false) => Resolve(text, now, zone, later, NextDay);

    private static TypedTime Resolve(string text, Instant now, DateTimeZone zone, bool later, Func<LocalTime, Instant, DateTimeZone, LocalDate> dayOf)
    {
        var match = Shape().Match(text.Trim());
        if (!match.Success || !int.TryParse(match.Groups["h"].Value, out var hour) || hour > 23 || int.Parse(match.Groups["m"].Value, CultureInfo.InvariantCulture) is var minute && minute > 59)
        {
            return Refused($"“{text.Trim()}” cannot be read as a time. Type it as 0540 or 05:40; for another day 30 Nov 05:40.");
        }

        var time = new LocalTime(hour, minute);
        var today = now.InZone(zone).Date;
        LocalDate? day = match.Groups["d"].Success ? NamedDay(match, today) : dayOf(time, now, zone);
        return day is { } known ? InZone(known + time, now, zone, later) : Refused($"There is no day {match.Groups["d"].Value} {match.Groups["mon"].Value}.");
    }

    private static TypedTime InZone(LocalDateTime local, Instant now, DateTimeZone zone, bool later)
    {
        var mapping = zone.MapLocal(local);
        return mapping.Count switch
        {
            0 => Refused($"{Clock(local)} did not exist on that day: the clocks went forward."),
            1 => Resolved(mapping.Single().ToInstant(), now, zone),
            _ => Resolved((later ? mapping.Last() : mapping.First()).ToInstant(), now, zone) with { Choices = [mapping.First().ToInstant(), mapping.Last().ToInstant()] },
        };
    }

    private static TypedTime Resolved(Instant at, Instant now, DateTimeZone zone)
    {
        var day = at.InZone(zone).Date == now.InZone(zone).Date ? "today " : "";
        return new(at, day + Format.Time(at, now, zone) + ", " + (at > now ? "in " + Format.Length(at - now) : Format.Ago(at, now)), null, []);
    }

    private static LocalDate PastDay(LocalTime time, Instant now, DateTimeZone zone)
    {
        var today = now.InZone(zone).Date;
        var yesterday = (today.PlusDays(-1) + time).InZoneLeniently(zone).ToInstant();
        return (today + time).InZoneLeniently(zone).ToInstant() > now + Ahead && now - yesterday <= BackAcrossMidnight ? today.PlusDays(-1) : today;
    }

    private static LocalDate NextDay(LocalTime time, Instant now, DateTimeZone zone)
    {
        var today = now.InZone(zone).Date;
        return (today + time).InZoneLeniently(zone).ToInstant() < now ? today.PlusDays(1) : today;
    }

    private static LocalDate? NamedDay(Match match, LocalDate today)
    {
        var month = Array.IndexOf(Months, match.Groups["mon"].Value[..3].ToLowerInvariant()) + 1;
        var day = int.Parse(match.Groups["d"].Value, CultureInfo.InvariantCulture);
        var year = match.Groups["y"].Success ? int.Parse(match.Groups["y"].Value, CultureInfo.InvariantCulture) : today.Year;
        if (month == 0 || day < 1 || day > CalendarSystem.Iso.GetDaysInMonth(year, month))
        {
            return null;
        }

        var named = new LocalDate(year, month, day);
        return !match.Groups["y"].Success && named > today.PlusMonths(6) ? named.PlusYears(-1) : named;
    }

    private static TypedTime Refused(string problem) => new(null, "", problem, []);

    private static string Clock(LocalDateTime local) => local.ToString("HH:mm", CultureInfo.InvariantCulture);

    [GeneratedRegex(@"^(?:(?<d>\d{1,2})\s+(?<mon>[A-Za-z]{3,9})\.?(?:\s+(?<y>20\d\d))?,?\s+)?(?<h>\d{2}|\d(?=:)):?(?<m>\d{2})$", RegexOptions.CultureInvariant)]
    private static partial Regex Shape();
}
