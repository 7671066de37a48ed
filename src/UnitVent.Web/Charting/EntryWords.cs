using NodaTime;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Fields;
using UnitVent.Web.Shared;

namespace UnitVent.Web.Charting;

/// <summary>What an entry says, on one line: every member that was recorded, as it was typed.</summary>
public static class EntryWords
{
    /// <summary>The members in words; the entry's own time and the unit of tensions left to their places.</summary>
    public static string Of(Entry body, Instant now, DateTimeZone zone)
    {
        var tension = (body as BloodGas)?.TensionUnit is { } unit ? Tensions.Name(unit) : "";
        var own = body.EffectiveAt();
        return string.Join(", ", EntryFields.Of(body.GetType())
            .Where(f => f.Name != "tensionUnit")
            .Select(f => (Field: f, Value: f.ValueIn(body)))
            .Where(m => m.Value is not null && !(m.Value is Instant at && at == own))
            .Select(m => Member(m.Field, m.Value!, tension, now, zone)));
    }

    private static string Member(EntryField field, object value, string tension, Instant now, DateTimeZone zone) => value switch
    {
        Instant at => $"{field.Label.ToLowerInvariant()} {Format.Time(at, now, zone)}",
        true => field.Label.ToLowerInvariant(),
        false => $"{field.Label.ToLowerInvariant()}: no",
        Enum choice => field.Label is "Mode" or "What" or "Circumstance" or "Phase" or "Method" or "Specimen" ? Words.Of(choice) : $"{field.Label.ToLowerInvariant()}: {Words.Within(choice)}",
        string text => field.Label is "Note" or "What" ? text : $"{field.Label.ToLowerInvariant()}: {text}",
        _ => $"{field.Label} {LastValues.Shown(value)}{Unit(field, tension)}",
    };

    private static string Unit(EntryField field, string tension) => field.Number switch
    {
        { IsTension: true } => " " + tension,
        { Unit.Length: > 0 } number => " " + number.Unit,
        _ => "",
    };
}
