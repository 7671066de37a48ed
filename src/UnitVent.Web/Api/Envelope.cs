using System.Text.Json;
using UnitVent.Charting.Results;

namespace UnitVent.Web.Api;

/// <summary>What every write carries, taken out of its members.</summary>
internal sealed class Envelope
{
    private const int MostConfirmed = 40;

    private readonly Dictionary<string, JsonElement> members;
    private readonly Guid? id;
    private readonly Guid? corrects;
    private readonly string? correctionReason;
    private readonly IReadOnlyList<string> confirmed;

    public Envelope(JsonElement body, bool corrections)
    {
        members = body.EnumerateObject().ToDictionary(m => m.Name, m => m.Value);
        id = Identifier("id");
        if (id is null && Errors.Count == 0)
        {
            Errors.Add(new("id", "missing", "An id made by the caller is needed (UUID version 7)."));
        }

        confirmed = Codes();
        if (corrections)
        {
            corrects = Identifier("corrects");
            correctionReason = Text("correctionReason");
        }

        Rest = JsonSerializer.SerializeToElement(members);
    }

    public List<FieldError> Errors { get; } = [];

    public JsonElement Rest { get; }

    public Sent<object> Around(object body) =>
        new(id!.Value, body) { Confirmed = confirmed, Corrects = corrects, CorrectionReason = correctionReason };

    private Guid? Identifier(string name)
    {
        if (Text(name) is not { } text)
        {
            return null;
        }

        if (Guid.TryParseExact(text, "D", out var parsed))
        {
            return parsed;
        }

        Errors.Add(new(name, "shape.id", $"{name} is not a UUID."));
        return null;
    }

    private string? Text(string name)
    {
        if (!members.Remove(name, out var value) || value.ValueKind == JsonValueKind.Null)
        {
            return null;
        }

        if (value.ValueKind == JsonValueKind.String)
        {
            return value.GetString();
        }

        Errors.Add(new(name, "shape.text", $"{name} is not a text."));
        return null;
    }

    private IReadOnlyList<string> Codes()
    {
        if (!members.Remove("confirmed", out var value) || value.ValueKind == JsonValueKind.Null)
        {
            return [];
        }

        if (value.ValueKind == JsonValueKind.Array && value.GetArrayLength() <= MostConfirmed
            && value.EnumerateArray().All(c => c.ValueKind == JsonValueKind.String))
        {
            return [.. value.EnumerateArray().Select(c => c.GetString()!)];
        }

        Errors.Add(new("confirmed", "shape.list", $"confirmed is not a list of at most {MostConfirmed} codes."));
        return [];
    }
}
