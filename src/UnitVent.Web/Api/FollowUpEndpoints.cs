using UnitVent.Charting.Entries;
using UnitVent.Charting.Fields;
using UnitVent.Store.Recording;

namespace UnitVent.Web.Api;

/// <summary>What becomes of follow-ups.</summary>
public static class FollowUpEndpoints
{
    private static readonly (string Path, FollowUpStep Step)[] Steps =
        [("done", FollowUpStep.Done), ("cancel", FollowUpStep.Cancelled), ("reassign", FollowUpStep.Reassigned)];

    public static void MapFollowUps(this IEndpointRouteBuilder api)
    {
        foreach (var (path, step) in Steps)
        {
            api.MapPost("/episodes/{id:guid}/follow-ups/{followUpId:guid}/" + path,
                    (Guid followUpId, HttpContext http, ChartRecorder recorder, CancellationToken cancel) => StepAsync(followUpId, step, http, recorder, cancel))
                .Writes<FollowUpForm>()
                .Produces<FollowUpAnswer>()
                .WithSummary($"A follow-up: {path}");
        }
    }

    private static async Task<IResult> StepAsync(Guid followUpId, FollowUpStep step, HttpContext http, ChartRecorder recorder, CancellationToken cancel)
    {
        var sent = await SentReader.WriteAsync<FollowUpForm>(http.Request);
        if (!sent.Succeeded)
        {
            return Problems.Of(sent);
        }

        var (form, id) = (sent.Value.Body, sent.Value.Id);
        var done = await recorder.FollowUpStepAsync(http.Actor(), followUpId, id, step, form.Reason, form.ForRole, cancel);
        return done.Succeeded ? TypedResults.Ok(new FollowUpAnswer(id, done.Value)) : Problems.Of(done);
    }
}

/// <summary>Why, and for whom.</summary>
public sealed record FollowUpForm
{
    [Field("Reason", MaxLength = 400)]
    public string? Reason { get; init; }

    [Field("For", MaxLength = 40)]
    public string? ForRole { get; init; }
}

/// <summary>What became of a follow-up.</summary>
public sealed record FollowUpAnswer(Guid Id, FollowUpStep Step);
