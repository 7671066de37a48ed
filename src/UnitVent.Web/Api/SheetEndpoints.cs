using UnitVent.Charting.Results;
using UnitVent.Handover;
using UnitVent.Web.Handover;
using UnitVent.Web.Hosting;

namespace UnitVent.Web.Api;

/// <summary>The printed sheets.</summary>
public static class SheetEndpoints
{
    public static void MapSheets(this IEndpointRouteBuilder api)
    {
        api.MapGet("/episodes/{id:guid}/handover.pdf", (Guid id, HttpContext http, Sheets sheets, CancellationToken cancel) =>
            AnswerAsync(http, paper => sheets.OfPatientsAsync(http.Actor(), [id], paper, cancel))).RequireRateLimiting(RateLimits.Sheets).WithSummary("A patient's sheet: `paper` a4 or letter");
        api.MapGet("/units/{code}/handover.pdf", (string code, HttpContext http, Sheets sheets, CancellationToken cancel) =>
            AnswerAsync(http, paper => sheets.OfUnitAsync(http.Actor(), code, paper, cancel))).RequireRateLimiting(RateLimits.Sheets).WithSummary("The unit's sheet: `paper` a4 or letter");
    }

    private static async Task<IResult> AnswerAsync(HttpContext http, Func<Paper, Task<Result<Sheet>>> print)
    {
        var asked = new Asked(http.Request.Query);
        var paper = asked.Choice<Paper>("paper") ?? Paper.A4;
        if (asked.Problem is { } problem)
        {
            return problem;
        }

        var sheet = await print(paper);
        return sheet.Succeeded ? sheet.Value.Answer(http) : Problems.Of(sheet);
    }
}
