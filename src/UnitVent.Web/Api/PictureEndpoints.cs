using NodaTime;
using UnitVent.Charting.Fields;
using UnitVent.Charting.Projections;
using UnitVent.Charting.Results;
using UnitVent.Charting.Timelines;
using UnitVent.Store.Reading;

namespace UnitVent.Web.Api;

/// <summary>What is computed from a chart.</summary>
public static class PictureEndpoints
{
    private static readonly Duration UsualSpan = Duration.FromHours(24);

    public static void MapPictures(this IEndpointRouteBuilder api)
    {
        api.MapGet("/episodes/{id:guid}/picture", PictureAsync).Produces<PictureBody>().WithSummary("Everything computed now, or at the instant given as `at`");
        api.MapPost("/episodes/{id:guid}/projection", ProjectionAsync).Accepts<ProposedSettings>("application/json").Produces<Projection>()
            .WithSummary("What follows from APRV settings that are considered; what is left out stays. Nothing is written");
        api.MapGet("/episodes/{id:guid}/timeline", TimelineAsync).Produces<Timeline>().WithSummary("The series behind the lanes, `from`–`to`; the last 24 h when not given");
    }

    private static async Task<IResult> PictureAsync(Guid id, HttpContext http, ChartReader charts, IClock clock, CancellationToken cancel)
    {
        var asked = new Asked(http.Request.Query);
        var at = asked.Time("at");
        if (asked.Problem is { } problem)
        {
            return problem;
        }

        if (at > clock.GetCurrentInstant())
        {
            return Problems.Of(Refusal.Value, [new FieldError("at", "time.future", "There is no picture of the future.")]);
        }

        var chart = await charts.PatientAsync(http.Actor(), id, at, cancel);
        return chart.Succeeded ? TypedResults.Ok(PictureBody.Of(chart.Value)) : Problems.Of(chart);
    }

    private static async Task<IResult> ProjectionAsync(Guid id, HttpContext http, ChartReader charts, CancellationToken cancel)
    {
        var json = await SentReader.JsonAsync(http.Request);
        var read = json.Succeeded ? FieldReader.Read(typeof(ProposedSettings), json.Value) : json.As<object>();
        if (!read.Succeeded)
        {
            return Problems.Of(read);
        }

        var chart = await charts.PatientAsync(http.Actor(), id, null, cancel);
        var projection = chart.Succeeded ? Projector.Of(chart.Value.Picture, (ProposedSettings)read.Value) : chart.As<Projection>();
        return projection.Succeeded ? TypedResults.Ok(projection.Value) : Problems.Of(projection);
    }

    private static async Task<IResult> TimelineAsync(Guid id, HttpContext http, ChartReader charts, IClock clock, CancellationToken cancel)
    {
        var asked = new Asked(http.Request.Query);
        var to = asked.Time("to") ?? clock.GetCurrentInstant();
        var from = asked.Time("from") ?? to - UsualSpan;
        if (asked.Problem is { } problem)
        {
            return problem;
        }

        var timeline = await charts.TimelineAsync(http.Actor(), id, from, to, cancel);
        return timeline.Succeeded ? TypedResults.Ok(timeline.Value) : Problems.Of(timeline);
    }
}
