using Microsoft.AspNetCore.Http.HttpResults;
using UnitVent.Charting.Episodes;
using UnitVent.Charting.Results;
using UnitVent.Store.Episodes;
using UnitVent.Store.People;
using UnitVent.Store.Reading;

namespace UnitVent.Web.Api;

/// <summary>Admitting, moving, ending; one episode.</summary>
public static class EpisodeEndpoints
{
    public static void MapEpisodes(this IEndpointRouteBuilder api)
    {
        api.MapPost("/units/{code}/episodes", AdmitAsync).Writes<AdmissionForm>().Produces<Made>(StatusCodes.Status201Created).WithSummary("Admit a patient and start an episode");
        api.MapGet("/episodes/{id:guid}", GetAsync).Produces<EpisodeBody>().WithSummary("One episode");
        api.MapPost("/episodes/{id:guid}/move", (Guid id, HttpContext http, EpisodeDesk desk, CancellationToken cancel) =>
            StepAsync<MoveForm>(http, (actor, sent) => desk.MoveAsync(actor, id, sent.Id, sent.Body.Bed!, cancel))).Writes<MoveForm>().WithSummary("Move to another bed");
        api.MapPost("/episodes/{id:guid}/end", (Guid id, HttpContext http, EpisodeDesk desk, CancellationToken cancel) =>
            StepAsync<EndForm>(http, (actor, sent) => desk.EndAsync(actor, id, sent.Id, sent.Body.EndedAt!.Value, sent.Body.Outcome!.Value, cancel))).Writes<EndForm>().WithSummary("End the episode");
        api.MapPost("/episodes/{id:guid}/reopen", (Guid id, HttpContext http, EpisodeDesk desk, CancellationToken cancel) =>
            StepAsync<ReasonForm>(http, (actor, sent) => desk.ReopenAsync(actor, id, sent.Id, sent.Body.Reason!, cancel))).Writes<ReasonForm>().WithSummary("Reopen an episode that ended within 48 h");
        api.MapPost("/episodes/{id:guid}/cancel", (Guid id, HttpContext http, EpisodeDesk desk, CancellationToken cancel) =>
            StepAsync<ReasonForm>(http, (actor, sent) => desk.CancelAsync(actor, id, sent.Id, sent.Body.Reason!, cancel))).Writes<ReasonForm>().WithSummary("Cancel a wrong admission");
    }

    private static async Task<IResult> AdmitAsync(string code, HttpContext http, EpisodeDesk desk, CancellationToken cancel)
    {
        var json = await SentReader.JsonAsync(http.Request);
        var admission = json.Succeeded ? AdmissionReader.Read(json.Value) : json.As<Admission>();
        if (!admission.Succeeded)
        {
            return Problems.Of(admission);
        }

        var admitted = await desk.AdmitAsync(http.Actor(), code, admission.Value, cancel);
        return !admitted.Succeeded ? Problems.Of(admitted)
            : admitted.Value.AlreadyStood ? TypedResults.Ok(new Made(admitted.Value.EpisodeId))
            : Created($"/api/v1/episodes/{admitted.Value.EpisodeId}", new Made(admitted.Value.EpisodeId));
    }

    private static async Task<IResult> GetAsync(Guid id, HttpContext http, ChartReader charts, CancellationToken cancel)
    {
        var chart = await charts.PatientAsync(http.Actor(), id, null, cancel);
        return chart.Succeeded ? TypedResults.Ok(EpisodeBody.Of(chart.Value)) : Problems.Of(chart);
    }

    private static async Task<IResult> StepAsync<T>(HttpContext http, Func<Actor, Sent<T>, Task<Result<Guid>>> step)
        where T : notnull
    {
        var sent = await SentReader.WriteAsync<T>(http.Request);
        if (!sent.Succeeded)
        {
            return Problems.Of(sent);
        }

        var done = await step(http.Actor(), sent.Value);
        return done.Succeeded ? TypedResults.Ok(new Made(done.Value)) : Problems.Of(done);
    }

    private static Created<Made> Created(string at, Made made) => TypedResults.Created(at, made);
}

/// <summary>The id of what was made or done.</summary>
public sealed record Made(Guid Id);
