using System.Text.Json;
using NodaTime;
using UnitVent.Charting.Fields;
using UnitVent.Charting.Results;
using UnitVent.Store.Flags;
using UnitVent.Store.Reading;

namespace UnitVent.Web.Api;

/// <summary>Flags, and who has them in hand.</summary>
public static class FlagEndpoints
{
    private enum Wanted
    {
        Open,
        All,
    }

    public static void MapFlags(this IEndpointRouteBuilder api)
    {
        api.MapGet("/episodes/{id:guid}/flags", ListAsync).Produces<IReadOnlyList<FlagBody>>().WithSummary("The flags of an episode, newest first: `state` open or all");
        api.MapPost("/flags/{id:guid}/acknowledge", AcknowledgeAsync).Writes<AcknowledgeForm>().Produces<FlagBody>().WithSummary("Take a flag in hand; it clears nothing");
    }

    private static async Task<IResult> ListAsync(Guid id, HttpContext http, ChartReader charts, CancellationToken cancel)
    {
        var asked = new Asked(http.Request.Query);
        var state = asked.Choice<Wanted>("state") ?? Wanted.Open;
        if (asked.Problem is { } problem)
        {
            return problem;
        }

        var flags = await charts.FlagsAsync(http.Actor(), id, state == Wanted.All, cancel);
        return flags.Succeeded ? TypedResults.Ok(flags.Value.Select(FlagBody.Of)) : Problems.Of(flags);
    }

    private static async Task<IResult> AcknowledgeAsync(Guid id, HttpContext http, FlagDesk desk, CancellationToken cancel)
    {
        var json = await SentReader.JsonAsync(http.Request);
        var sent = json.Succeeded ? Read(json.Value) : json.As<(Sent<object> Sent, ToldForm Told)>();
        if (!sent.Succeeded)
        {
            return Problems.Of(sent);
        }

        var ((write, told), form) = (sent.Value, (AcknowledgeForm)sent.Value.Sent.Body);
        var flag = await desk.AcknowledgeAsync(http.Actor(), id, write.Id, form.Plan, form.Until, told.Who, told.At, cancel, form.TakeOver == true);
        return flag.Succeeded ? TypedResults.Ok(FlagBody.Of(flag.Value)) : Problems.Of(flag);
    }

    private static Result<(Sent<object> Sent, ToldForm Told)> Read(JsonElement body)
    {
        var members = body.ValueKind == JsonValueKind.Object ? body.EnumerateObject().ToDictionary(m => m.Name, m => m.Value) : [];
        var told = members.Remove("told", out var toldJson) && toldJson.ValueKind != JsonValueKind.Null
            ? FieldReader.Read(typeof(ToldForm), toldJson)
            : Result<object>.Of(new ToldForm());
        var sent = SentReader.Write(typeof(AcknowledgeForm), JsonSerializer.SerializeToElement(members));
        List<FieldError> errors = [.. sent.Errors, .. told.Errors.Select(e => e with { Field = "told." + e.Field })];
        return errors.Count > 0
            ? Result<(Sent<object>, ToldForm)>.Refused(Refusal.Shape, errors)
            : Result<(Sent<object>, ToldForm)>.Of((sent.Value, (ToldForm)told.Value));
    }
}

/// <summary>What is planned, and until when it is in hand.</summary>
public sealed record AcknowledgeForm
{
    [Field("Plan", MaxLength = 400)]
    public string? Plan { get; init; }

    [Field("Until")]
    public Instant? Until { get; init; }

    [Field("Take over")]
    public bool? TakeOver { get; init; }
}

/// <summary>Who was told, and when.</summary>
public sealed record ToldForm
{
    [Field("Told", MaxLength = 120)]
    public string? Who { get; init; }

    [Field("Told at")]
    public Instant? At { get; init; }
}
