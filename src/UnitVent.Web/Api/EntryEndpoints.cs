using UnitVent.Charting.Entries;
using UnitVent.Store.Reading;
using UnitVent.Store.Recording;

namespace UnitVent.Web.Api;

/// <summary>Recording entries of every kind, reading them, striking them out.</summary>
public static class EntryEndpoints
{
    private static readonly (string Path, EntryKind Kind)[] Kinds =
    [
        ("setting-changes", EntryKind.SettingChange),
        ("blood-gases", EntryKind.BloodGas),
        ("ventilator-checks", EntryKind.VentilatorCheck),
        ("breathing-checks", EntryKind.BreathingCheck),
        ("airway-checks", EntryKind.AirwayCheck),
        ("events", EntryKind.Event),
        ("context", EntryKind.Context),
        ("targets", EntryKind.Target),
        ("phase", EntryKind.Phase),
        ("method", EntryKind.Method),
        ("notes", EntryKind.Note),
        ("follow-ups", EntryKind.FollowUp),
    ];

    public static void MapEntries(this IEndpointRouteBuilder api)
    {
        foreach (var (path, kind) in Kinds)
        {
            var type = EntryTypes.Of(kind);
            api.MapPost("/episodes/{id:guid}/" + path, (Guid id, HttpContext http, ChartRecorder recorder, CancellationToken cancel) => RecordAsync(id, type, http, recorder, cancel))
                .WithMetadata(new WriteDescription(type, Corrections: true))
                .Produces<EntryItem>(StatusCodes.Status201Created)
                .WithSummary($"Record: {path}");
        }

        api.MapGet("/episodes/{id:guid}/entries", ListAsync).Produces<EntryPageBody>().WithSummary("Everything charted, newest first, in pages");
        api.MapPost("/episodes/{id:guid}/entries/{entryId:guid}/strike-out", StrikeOutAsync).Writes<ReasonForm>().Produces<EntryItem>().WithSummary("Strike out an entry; it stays, marked");
    }

    private static async Task<IResult> RecordAsync(Guid id, Type type, HttpContext http, ChartRecorder recorder, CancellationToken cancel)
    {
        var json = await SentReader.JsonAsync(http.Request);
        var sent = json.Succeeded ? SentReader.Write(type, json.Value, corrections: true) : json.As<Sent<object>>();
        if (!sent.Succeeded)
        {
            return Problems.Of(sent);
        }

        var recorded = await recorder.RecordAsync(http.Actor(), id, [Entry(sent.Value)], cancel);
        return recorded.Succeeded ? Answer(recorded.Value) : Problems.Of(recorded);
    }

    private static NewEntry Entry(Sent<object> sent) => new(sent.Id, (Entry)sent.Body)
    {
        Confirmed = sent.Confirmed,
        Corrects = sent.Corrects,
        CorrectionReason = sent.CorrectionReason,
    };

    private static IResult Answer(RecordReceipt receipt)
    {
        var item = EntryItem.Of(receipt.Entries[0]);
        return receipt.AlreadyStood ? TypedResults.Ok(item) : TypedResults.Created((string?)null, item);
    }

    private static async Task<IResult> ListAsync(Guid id, HttpContext http, ChartReader charts, CancellationToken cancel)
    {
        var asked = new Asked(http.Request.Query);
        var query = new EntryQuery(asked.Time("from"), asked.Time("to"), asked.Choice<EntryKind>("kind"), asked.Text("after"), asked.Whole("limit") ?? 100);
        if (asked.Problem is { } problem)
        {
            return problem;
        }

        var page = await charts.EntriesAsync(http.Actor(), id, query, cancel);
        return page.Succeeded ? TypedResults.Ok(new EntryPageBody([.. page.Value.Items.Select(EntryItem.Of)], page.Value.Next)) : Problems.Of(page);
    }

    private static async Task<IResult> StrikeOutAsync(Guid id, Guid entryId, HttpContext http, ChartRecorder recorder, CancellationToken cancel)
    {
        var sent = await SentReader.WriteAsync<ReasonForm>(http.Request);
        if (!sent.Succeeded)
        {
            return Problems.Of(sent);
        }

        var struck = await recorder.StrikeOutAsync(http.Actor(), id, entryId, sent.Value.Id, sent.Value.Body.Reason!, cancel);
        return struck.Succeeded ? TypedResults.Ok(EntryItem.Of(struck.Value)) : Problems.Of(struck);
    }
}

/// <summary>A page of entries.</summary>
/// <param name="Items">Newest first.</param>
/// <param name="Next">What to send as <c>after</c> for the next page; null on the last.</param>
public sealed record EntryPageBody(IReadOnlyList<EntryItem> Items, string? Next);
