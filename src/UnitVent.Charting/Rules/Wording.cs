using System.Globalization;
using NodaTime;
using UnitVent.Charting.Pictures;

namespace UnitVent.Charting.Rules;

/// <summary>Numbers and times as sentences carry them.</summary>
internal static class Wording
{
    public static string Number(double value, int decimals = 0) =>
        Math.Round(value, decimals, MidpointRounding.AwayFromZero).ToString("F" + decimals, CultureInfo.InvariantCulture).Replace('-', '−');

    public static string Hours(Duration age) => age.TotalHours < 10 ? Number(age.TotalHours, 1) + " h" : Number(age.TotalHours) + " h";

    /// <summary>A time in the unit's zone, with its day when that is not the picture's.</summary>
    public static string Clock(Instant at, PatientPicture picture)
    {
        var zone = picture.Window.Unit.Zone;
        var local = at.InZone(zone);
        return local.ToString(local.Date == picture.AsOf.InZone(zone).Date ? "HH:mm" : "ddd d MMM HH:mm", CultureInfo.InvariantCulture);
    }
}
