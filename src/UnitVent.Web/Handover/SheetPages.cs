using UnitVent.Charting.Results;
using UnitVent.Handover;
using UnitVent.Store.People;
using UnitVent.Web.Api;
using UnitVent.Web.Hosting;
using UnitVent.Web.Shared;

namespace UnitVent.Web.Handover;

/// <summary>The sheets for whoever is signed in, each in a tab of its own.</summary>
public static class SheetPages
{
    private const int MostPatients = 60;

    public static void MapSheetPages(this IEndpointRouteBuilder routes)
    {
        var sheets = routes.MapGroup("/sheets").RequireAuthorization().RequireRateLimiting(RateLimits.Sheets).ExcludeFromDescription();
        sheets.MapGet("/episodes/{id:guid}.pdf", (Guid id, HttpContext http, Sheets print, UserDesk users, CancellationToken cancel) =>
            AnswerAsync(http, users, (actor, paper) => print.OfPatientsAsync(actor, [id], paper, cancel)));
        sheets.MapGet("/episodes.pdf", (Guid[] id, HttpContext http, Sheets print, UserDesk users, CancellationToken cancel) =>
            id.Length is 0 or > MostPatients
                ? Task.FromResult<IResult>(TypedResults.Text("Choose at least one patient.", statusCode: StatusCodes.Status400BadRequest))
                : AnswerAsync(http, users, (actor, paper) => print.OfPatientsAsync(actor, id, paper, cancel)));
        sheets.MapGet("/units/{code}.pdf", (string code, HttpContext http, Sheets print, UserDesk users, CancellationToken cancel) =>
            AnswerAsync(http, users, (actor, paper) => print.OfUnitAsync(actor, code, paper, cancel)));
    }

    private static async Task<IResult> AnswerAsync(HttpContext http, UserDesk users, Func<Actor, Paper, Task<Result<Sheet>>> print)
    {
        var actor = await CurrentActor.OfAsync(users, http.User, http.RequestAborted);
        var paper = Choices.Read<Paper>(http.Request.Query["paper"].ToString()) ?? Paper.A4;
        var sheet = await print(actor, paper);
        return sheet.Refusal switch
        {
            null => sheet.Value.Answer(http),
            Refusal.Unavailable => TypedResults.Text("The store did not answer. Try again in a moment.", statusCode: StatusCodes.Status503ServiceUnavailable),
            Refusal.Denied => TypedResults.Forbid(),
            _ => TypedResults.NotFound(),
        };
    }
}
