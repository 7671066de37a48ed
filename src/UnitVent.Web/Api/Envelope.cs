using System.Text.Json;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Results;

namespace UnitVent.Web.Api;

/// <summary>What every write carries, taken out of its members.</summary>
internal sealed class Envelope
{
    private const int MostConfirmed = 40;

    private readonly Dictionary<string, JsonElement> members;
    private readonly Guid? corrects;
    private readonly string? correctionReason;
    private readonly IReadOnlyList<string> confirmed;

    /// <param name="body">The object that was sent.</param>
    /// <param name="corrections">Whether it may correct another.</param>
    /// <param name="idOtherwise">The id when none was sent; null where one is needed.</param>
    public Envelope(JsonElement body, bool corrections, Guid? idOtherwise = null)
    {
        members = body.EnumerateObject().ToDictionary(m => m.Name, m => m.Value);
        Id = Identifier("id") ?? idOtherwise;
        if (Id is null && Errors.Count == 0)
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

    public Guid? Id { get; }

    public List<FieldError> Errors { get; } = [];

    /// <summary>The other members.</summary>
    public JsonElement Rest { get; }

    public Sent<object> Around(object body) => new(Id!.Value, body) { Confirmed = confirmed, Corrects = corrects, CorrectionReason = correctionReason };

    public NewEntry Entry(Entry body) => new(Id!.Value, body) { Confirmed = confirmed, Corrects = corrects, CorrectionReason = correctionReason };

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
