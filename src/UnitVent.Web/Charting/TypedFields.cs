using System.Text.Json;
using System.Text.Json.Nodes;
using NodaTime;
using UnitVent.Charting.Fields;
using UnitVent.Charting.Results;

namespace UnitVent.Web.Charting;

/// <summary>Reads typed fields as the type that they belong to, and says everything that has the wrong shape at once.</summary>
public static class TypedFields
{
    public static Result<object> Read(Type type, IEnumerable<FormField> fields, Instant now, DateTimeZone zone, Func<FormField, JsonNode?>? otherwise = null)
    {
        var body = new JsonObject();
        var problems = new List<FieldError>();
        foreach (var field in fields)
        {
            var (value, problem) = field.IsEmpty && otherwise?.Invoke(field) is { } given ? (given, null) : field.Read(now, zone);
            if (problem is not null)
            {
                problems.Add(new(field.Field.Name, "typed", problem));
            }
            else if (value is not null)
            {
                body[field.Field.Name] = value;
            }
        }

        var read = FieldReader.Read(type, JsonSerializer.SerializeToElement(body));
        problems.AddRange(read.Errors.Where(e => problems.All(p => p.Field != e.Field)));
        return problems.Count > 0 ? Result<object>.Refused(Refusal.Shape, problems) : read;
    }
}
