using NodaTime;
using UnitVent.Charting.Results;

namespace UnitVent.Store.Units;

/// <summary>What a unit and its settings may be.</summary>
internal static class UnitCheck
{
    private const int LongestCode = 12;
    private const int LongestName = 120;
    private const int LongestBed = 20;
    private const double LowestAltitudeM = -430; // the shore of the Dead Sea
    private const double HighestAltitudeM = 6000;

    private static readonly Duration ShortestInterval = Duration.FromHours(1);
    private static readonly Duration LongestInterval = Duration.FromHours(12);

    public static IEnumerable<FieldError> Of(NewUnit unit)
    {
        if (unit.Code.Length is 0 or > LongestCode || !unit.Code.All(c => char.IsAsciiLetterUpper(c) || char.IsAsciiDigit(c) || c == '-'))
        {
            yield return new("code", "limit", $"The code is 1–{LongestCode} capitals, digits or hyphens.");
        }

        if (string.IsNullOrWhiteSpace(unit.Name) || unit.Name.Length > LongestName)
        {
            yield return new("name", "limit", $"The name is 1–{LongestName} characters long.");
        }

        if (DateTimeZoneProviders.Tzdb.GetZoneOrNull(unit.TimeZone) is null)
        {
            yield return new("timeZone", "unknown", $"There is no time zone {unit.TimeZone}; an IANA name is needed, such as Europe/Zurich.");
        }

        if (unit.Beds.Select(b => b.Trim()).Distinct().Count() != unit.Beds.Count)
        {
            yield return new("beds", "twice", "Two beds have the same name.");
        }

        foreach (var error in unit.Beds.Select(BedName).OfType<FieldError>().Take(1).Concat(Settings(unit.Settings)))
        {
            yield return error;
        }
    }

    public static IEnumerable<FieldError> Settings(UnitSettings settings)
    {
        if (!(settings.AltitudeM >= LowestAltitudeM && settings.AltitudeM <= HighestAltitudeM))
        {
            yield return new("altitudeM", "limit", $"The altitude is {LowestAltitudeM:0} to {HighestAltitudeM:0} m.");
        }

        if (settings.CheckInterval < ShortestInterval || settings.CheckInterval > LongestInterval)
        {
            yield return new("checkInterval", "limit", "The check interval is 1 to 12 h.");
        }

        if (settings.ShiftStarts.Count == 0 || settings.ShiftStarts.Distinct().Count() != settings.ShiftStarts.Count)
        {
            yield return new("shiftStarts", "limit", "At least one shift start is needed, and none twice.");
        }
    }

    public static FieldError? BedName(string name) => string.IsNullOrWhiteSpace(name) || name.Trim().Length > LongestBed
        ? new("bed", "limit", $"A bed's name is 1–{LongestBed} characters long.")
        : null;
}
