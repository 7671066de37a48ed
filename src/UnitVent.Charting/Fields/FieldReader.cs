using System.Globalization;
using System.Text.Json;
using UnitVent.Charting.Results;

namespace UnitVent.Charting.Fields;

/// <summary>Reads what was typed or sent into its type, and says everything that has the wrong shape at once.</summary>
/// <remarks>Shape only: whether a value can be is <c>EntryCheck</c>'s affair.</remarks>
public static class FieldReader
{
    /// <summary>Reads a JSON object as the type.</summary>
    /// <param name="type">A type whose members carry <see cref="FieldAttribute"/>.</param>
    /// <param name="body">The object. Members that the type does not have are refused by name.</param>
    public static Result<object> Read(Type type, JsonElement body)
    {
        if (body.ValueKind != JsonValueKind.Object)
        {
            return Result<object>.Refused(Refusal.Shape, "", "shape.object", "A JSON object is needed.");
        }

        var fields = EntryFields.Of(type);
        var errors = Unknown(body, fields).Concat(fields.SelectMany(f => Check(f, body))).ToList();
        return errors.Count > 0
            ? Result<object>.Refused(Refusal.Shape, errors)
            : Result<object>.Of(body.Deserialize(type, ChartJson.Options)!);
    }

    private static IEnumerable<FieldError> Unknown(JsonElement body, IReadOnlyList<EntryField> fields) =>
        body.EnumerateObject()
            .Where(m => fields.All(f => f.Name != m.Name))
            .Select(m => new FieldError(m.Name, "shape.unknown", $"There is no member {m.Name} here."));

    private static IEnumerable<FieldError> Check(EntryField field, JsonElement body)
    {
        var present = body.TryGetProperty(field.Name, out var value) && value.ValueKind != JsonValueKind.Null;
        if (!present)
        {
            return field.Required ? [new(field.Name, "missing", $"{field.Label} is needed.")] : [];
        }

        return Fits(field, value) ? [] : [new(field.Name, "shape." + CodeOf(field.Kind), $"{field.Label}: {Wanted(field)} is needed, not {Shown(value)}.")];
    }

    private static bool Fits(EntryField field, JsonElement value) => field.Kind switch
    {
        FieldKind.Number => value.ValueKind == JsonValueKind.Number && value.TryGetDecimal(out _),
        FieldKind.Whole => value.ValueKind == JsonValueKind.Number && value.TryGetInt32(out _),
        FieldKind.YesNo => value.ValueKind is JsonValueKind.True or JsonValueKind.False,
        FieldKind.Text => value.ValueKind == JsonValueKind.String,
        FieldKind.Time => value.ValueKind == JsonValueKind.String && InstantJson.Rfc3339.Parse(value.GetString()!).Success,
        FieldKind.Date => value.ValueKind == JsonValueKind.String && NodaTime.Text.LocalDatePattern.Iso.Parse(value.GetString()!).Success,
        FieldKind.Choice => value.ValueKind == JsonValueKind.String && field.Choices.Contains(value.GetString()),
    };

    private static string CodeOf(FieldKind kind) => kind.ToString().ToLower(CultureInfo.InvariantCulture);

    private static string Wanted(EntryField field) => field.Kind switch
    {
        FieldKind.Number => "a number",
        FieldKind.Whole => "a whole number",
        FieldKind.YesNo => "yes or no",
        FieldKind.Text => "a text",
        FieldKind.Time => "a time with its offset from UTC",
        FieldKind.Date => "a date as year-month-day",
        FieldKind.Choice => "one of " + string.Join(", ", field.Choices),
    };

    private static string Shown(JsonElement value)
    {
        var text = value.ToString();
        return text.Length > 40 ? text[..40] + "…" : text.Length == 0 ? "an empty text" : text;
    }
}
