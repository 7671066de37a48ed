using System.Text.Json;
using System.Text.Json.Nodes;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Fields;
using UnitVent.Charting.Pictures;
using UnitVent.Web.Shared;

namespace UnitVent.Web.Charting;

/// <summary>Puts the last value beside each field. Only what is in force, settings and targets, is saved again when nothing is typed.</summary>
public static class LastValues
{
    private static readonly HashSet<string> OfTheMoment =
        ["effectiveAt", "drawnAt", "observedAt", "at", "from", "until", "dueAt", "expiresAt", "reason", "phase", "sampleNumber", "relativeToChange", "site",
         "specimen", "tensionUnit", "settingsConfirmed", "curveNotReadable", "rassNotAssessable", "alarmsChecked", "temperatureCorrected"];

    /// <summary>Gives the fields of a form their last values. Called again when the mode changes: another mode carries on FiO2 alone.</summary>
    public static void Give(EntryForm form, PatientPicture picture)
    {
        foreach (var field in form.Fields)
        {
            field.Last = Of(form, field, picture);
        }
    }

    private static LastValue? Of(EntryForm form, FormField field, PatientPicture picture)
    {
        var name = field.Field.Name;
        if (form is { Kind: EntryKind.BloodGas } && name == "fiO2")
        {
            return picture.Settings is { } set ? From(set.Entry, EntryFields.Of<SettingChange>().First(f => f.Name == name), carried: false) : null;
        }

        return OfTheMoment.Contains(name) ? null : form.Kind switch
        {
            EntryKind.SettingChange => picture.Settings is { } set ? From(set.Entry, field.Field, CarriesOn(form, name, set.Body.Mode)) : null,
            EntryKind.Target => picture.Targets is { } targets ? From(targets.Entry, field.Field, carried: true) : null,
            EntryKind.BloodGas or EntryKind.VentilatorCheck or EntryKind.BreathingCheck or EntryKind.AirwayCheck => LatestWith(form.Kind, field.Field, picture),
            EntryKind.Event or EntryKind.Context or EntryKind.Phase or EntryKind.Method or EntryKind.Note or EntryKind.FollowUp => null,
        };
    }

    private static bool CarriesOn(EntryForm form, string name, VentilationMode? inForce) =>
        name is "fiO2" or "mode" || form["mode"].IsEmpty || form.Mode == inForce;

    private static LastValue? LatestWith(EntryKind kind, EntryField field, PatientPicture picture) =>
        picture.Window.Latest<Entry>(kind, picture.AsOf, e => field.ValueIn(e) is not null) is { } last ? From(last.Entry, field, carried: false) : null;

    private static LastValue? From(ChartEntry entry, EntryField field, bool carried) => field.ValueIn(entry.Body) is { } value
        ? new(Shown(value), entry.EffectiveAt, carried, Json(entry.Body)[field.Name])
        : null;

    internal static string Shown(object value) => value switch
    {
        decimal number => Format.Typed(number),
        int whole => Format.Typed(whole),
        bool yes => yes ? "Yes" : "No",
        Enum choice => Words.Of(choice),
        _ => value.ToString() ?? "",
    };

    internal static JsonNode Json(Entry body) => JsonSerializer.SerializeToNode(body, body.GetType(), ChartJson.Options)!;
}
