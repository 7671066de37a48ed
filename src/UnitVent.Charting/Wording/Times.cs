using System.Globalization;
using NodaTime;
using UnitVent.Charting.Pictures;

namespace UnitVent.Charting.Wording;

/// <summary>Times as sentences carry them.</summary>
internal static class Times
{
    public static string Hours(Duration age) => age.TotalHours < 10 ? Numbers.Fixed(age.TotalHours, 1) + " h" : Numbers.Fixed(age.TotalHours) + " h";

    /// <summary>A time in the unit's zone, with its day when that is not the picture's.</summary>
    public static string Clock(Instant at, PatientPicture picture)
    {
        var zone = picture.Window.Unit.Zone;
        var local = at.InZone(zone);
        return local.ToString(local.Date == picture.AsOf.InZone(zone).Date ? "HH:mm" : "ddd d MMM HH:mm", CultureInfo.InvariantCulture);
    }
}
