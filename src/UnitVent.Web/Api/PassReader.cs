using System.Buffers.Binary;
using System.Security.Cryptography;
using System.Text.Json;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Results;

namespace UnitVent.Web.Api;

/// <summary>A round as it was sent.</summary>
public sealed record Pass(Guid Id, IReadOnlyList<NewEntry> Entries);

/// <summary>Reads a round, and says everything that has the wrong shape at once.</summary>
public static class PassReader
{
    private const int MostEntries = 20;
    private const string List = "entries";

    public static Result<Pass> Read(JsonElement body)
    {
        if (body.ValueKind != JsonValueKind.Object)
        {
            return Result<Pass>.Refused(Refusal.Shape, "", "shape.object", "A JSON object is needed.");
        }

        var envelope = new Envelope(body, corrections: false);
        List<FieldError> errors = [.. envelope.Errors, .. Unknown(envelope.Rest, [List], "")];
        if (!envelope.Rest.TryGetProperty(List, out var items) || items.ValueKind != JsonValueKind.Array || items.GetArrayLength() is 0 or > MostEntries)
        {
            errors.Add(new(List, "shape.list", $"{List}: a list of 1 to {MostEntries} entries is needed."));
            return Result<Pass>.Refused(Refusal.Shape, errors);
        }

        var passId = envelope.Id ?? Guid.Empty;
        var read = items.EnumerateArray().Select((item, i) => Item(item, IdOf(passId, i), $"{List}[{i}].")).ToList();
        errors.AddRange(read.SelectMany(r => r.Errors));
        return errors.Count > 0 ? Result<Pass>.Refused(Refusal.Shape, errors) : Result<Pass>.Of(new Pass(passId, read.ConvertAll(r => r.Value)));
    }

    private static Result<NewEntry> Item(JsonElement item, Guid idOtherwise, string prefix)
    {
        if (item.ValueKind != JsonValueKind.Object)
        {
            return Result<NewEntry>.Refused(Refusal.Shape, prefix.TrimEnd('.'), "shape.object", "A JSON object is needed.");
        }

        var envelope = new Envelope(item, corrections: true, idOtherwise);
        List<FieldError> errors = [.. envelope.Errors, .. Unknown(envelope.Rest, ["kind", "body"], "")];
        var kind = envelope.Rest.TryGetProperty("kind", out var named) && named.ValueKind == JsonValueKind.String ? Choices.Read<EntryKind>(named.GetString()) : null;
        if (kind is null)
        {
            errors.Add(new("kind", "shape.choice", $"kind: one of {string.Join(", ", Choices.Names<EntryKind>())} is needed."));
        }
        else
        {
            envelope.Rest.TryGetProperty("body", out var body);
            var read = UnitVent.Charting.Fields.FieldReader.Read(EntryTypes.Of(kind.Value), body);
            errors.AddRange(read.Errors.Select(e => e with { Field = "body." + e.Field }));
            if (errors.Count == 0)
            {
                return Result<NewEntry>.Of(envelope.Entry((Entry)read.Value));
            }
        }

        return Result<NewEntry>.Refused(Refusal.Shape, [.. errors.Select(e => e with { Field = prefix + e.Field })]);
    }

    private static IEnumerable<FieldError> Unknown(JsonElement rest, string[] known, string prefix) =>
        rest.EnumerateObject().Where(m => !known.Contains(m.Name)).Select(m => new FieldError(prefix + m.Name, "shape.unknown", $"There is no member {m.Name} here."));

    /// <summary>The id of an entry that was sent without one: the same pass sent again has the same entries. UUID version 8 (RFC 9562).</summary>
    private static Guid IdOf(Guid pass, int place)
    {
        Span<byte> named = stackalloc byte[20];
        pass.TryWriteBytes(named, bigEndian: true, out _);
        BinaryPrimitives.WriteInt32BigEndian(named[16..], place);
        var id = SHA256.HashData(named).AsSpan(0, 16);
        id[6] = (byte)(0x80 | (id[6] & 0x0F));
        id[8] = (byte)(0x80 | (id[8] & 0x3F));
        return new Guid(id, bigEndian: true);
    }
}
