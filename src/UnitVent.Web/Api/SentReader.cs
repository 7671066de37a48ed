using System.Text.Json;
using UnitVent.Charting.Fields;
using UnitVent.Charting.Results;

namespace UnitVent.Web.Api;

/// <summary>Reads request bodies: the envelope that every write has, and the members of the thing, with every shape error at once.</summary>
public static class SentReader
{
    private static readonly JsonDocumentOptions Strict = new() { AllowDuplicateProperties = false, MaxDepth = 16 };

    /// <summary>The body of a request as JSON.</summary>
    /// <exception cref="BadHttpRequestException">It is longer than this endpoint takes.</exception>
    public static async Task<Result<JsonElement>> JsonAsync(HttpRequest request)
    {
        try
        {
            using var document = await JsonDocument.ParseAsync(request.Body, Strict, request.HttpContext.RequestAborted);
            return Result<JsonElement>.Of(document.RootElement.Clone());
        }
        catch (JsonException)
        {
            return Result<JsonElement>.Refused(Refusal.Shape, "", "shape.json", "The body is not JSON, or names a member twice.");
        }
    }

    /// <summary>A write whose members have fields, for example an entry.</summary>
    public static Result<Sent<object>> Write(Type type, JsonElement body, bool corrections = false)
    {
        if (body.ValueKind != JsonValueKind.Object)
        {
            return FieldReader.Read(type, body).As<Sent<object>>();
        }

        var envelope = new Envelope(body, corrections);
        var read = FieldReader.Read(type, envelope.Rest);
        List<FieldError> errors = [.. envelope.Errors, .. read.Errors];
        return errors.Count > 0 ? Result<Sent<object>>.Refused(Refusal.Shape, errors) : Result<Sent<object>>.Of(envelope.Around(read.Value));
    }

    /// <summary>A write whose members have fields, in its own type.</summary>
    public static async Task<Result<Sent<T>>> WriteAsync<T>(HttpRequest request)
        where T : notnull
    {
        var json = await JsonAsync(request);
        if (!json.Succeeded)
        {
            return json.As<Sent<T>>();
        }

        var sent = Write(typeof(T), json.Value);
        return sent.Succeeded
            ? Result<Sent<T>>.Of(new Sent<T>(sent.Value.Id, (T)sent.Value.Body) { Confirmed = sent.Value.Confirmed })
            : sent.As<Sent<T>>();
    }
}
