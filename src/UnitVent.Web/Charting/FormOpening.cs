using System.Globalization;
using System.Text.Json.Nodes;
using NodaTime;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Pictures;

namespace UnitVent.Web.Charting;

/// <summary>Opens forms: empty ones with the last values beside the fields, or one with an entry that is to be corrected.</summary>
public static class FormOpening
{
    /// <summary>An empty form. Nothing is filled in but the unit in which the unit's analyser prints tensions.</summary>
    public static EntryForm Empty(EntryKind kind, PatientPicture picture)
    {
        var form = new EntryForm(kind, Guid.CreateVersion7());
        if (kind == EntryKind.BloodGas)
        {
            form["tensionUnit"].Text = picture.Window.Unit.TensionUnit == TensionUnit.KPa ? "kPa" : "mmHg";
        }

        LastValues.Give(form, picture);
        return form;
    }

    /// <summary>A form that shows an entry as it was typed, to be recorded anew in its place.</summary>
    public static EntryForm Correction(ChartEntry entry, DateTimeZone zone)
    {
        var form = new EntryForm(entry.Kind, Guid.CreateVersion7()) { Corrects = entry.Id };
        var json = LastValues.Json(entry.Body);
        foreach (var field in form.Fields)
        {
            if (field.Field.ValueIn(entry.Body) is { } value && json[field.Field.Name] is { } kept)
            {
                field.Keep(Typed(value, kept, zone), kept);
            }
        }

        return form;
    }

    private static string Typed(object value, JsonNode json, DateTimeZone zone) => value switch
    {
        Instant at => at.InZone(zone).ToString("d MMM uuuu HH:mm", CultureInfo.InvariantCulture),
        decimal number => number.ToString(CultureInfo.InvariantCulture),
        _ => json.ToString(),
    };
}
