using Microsoft.AspNetCore.Mvc;
using UnitVent.Store.Recording;

namespace UnitVent.Web.Api;

/// <summary>One ventilator round: several entries in one transaction.</summary>
public static class PassEndpoint
{
    private const int BodyLimitBytes = 256 * 1024;

    public static void MapPass(this IEndpointRouteBuilder api) =>
        api.MapPost("/episodes/{id:guid}/pass", RecordAsync)
            .WithMetadata(new RequestSizeLimitAttribute(BodyLimitBytes))
            .Produces<PassBody>(StatusCodes.Status201Created)
            .WithSummary("Record one ventilator round: all of its entries, or none")
            .WithDescription("{ id, entries: [ { kind, body, confirmed, corrects, correctionReason, id } ] }. An entry without an id of its own takes one that follows from the id of the pass.");

    private static async Task<IResult> RecordAsync(Guid id, HttpContext http, ChartRecorder recorder, CancellationToken cancel)
    {
        var json = await SentReader.JsonAsync(http.Request);
        var pass = json.Succeeded ? PassReader.Read(json.Value) : json.As<Pass>();
        if (!pass.Succeeded)
        {
            return Problems.Of(pass);
        }

        var recorded = await recorder.RecordAsync(http.Actor(), id, pass.Value.Entries, cancel);
        if (!recorded.Succeeded)
        {
            return Problems.Of(recorded);
        }

        var body = new PassBody(pass.Value.Id, [.. recorded.Value.Entries.Select(EntryItem.Of)]);
        return recorded.Value.AlreadyStood ? TypedResults.Ok(body) : TypedResults.Created((string?)null, body);
    }
}

/// <summary>A recorded round.</summary>
public sealed record PassBody(Guid Id, IReadOnlyList<EntryItem> Entries);
