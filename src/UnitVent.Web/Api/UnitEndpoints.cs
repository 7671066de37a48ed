using NodaTime;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Episodes;
using UnitVent.Store.Reading;

namespace UnitVent.Web.Api;

/// <summary>Units and their boards.</summary>
public static class UnitEndpoints
{
    public static void MapUnits(this IEndpointRouteBuilder api)
    {
        api.MapGet("/units", ListAsync).Produces<IReadOnlyList<UnitBody>>().WithSummary("The units that the token sees");
        api.MapGet("/units/{code}/board", BoardAsync).Produces<BoardBody>().WithSummary("One row for each ventilated patient, in the order in which they want attention");
    }

    private static async Task<IResult> ListAsync(HttpContext http, ChartReader charts, CancellationToken cancel)
    {
        var units = await charts.UnitsAsync(http.Actor(), cancel);
        return units.Succeeded ? TypedResults.Ok(units.Value.Select(UnitBody.Of)) : Problems.Of(units);
    }

    private static async Task<IResult> BoardAsync(string code, HttpContext http, UnitBoards boards, IClock clock, CancellationToken cancel)
    {
        var board = await boards.GetAsync(http.Actor(), code, cancel);
        return board.Succeeded ? TypedResults.Ok(BoardBody.Of(board.Value, clock.GetCurrentInstant())) : Problems.Of(board);
    }
}

/// <summary>A unit as the interface writes it.</summary>
public sealed record UnitBody(
    string Code, string Name, string TimeZone, double AltitudeM, TensionUnit TensionUnit, SettingMethod Method, bool Demonstration, IReadOnlyList<string> Beds)
{
    public static UnitBody Of(UnitProfile unit) =>
        new(unit.Code, unit.Name, unit.Zone.Id, unit.AltitudeM, unit.TensionUnit, unit.Method, unit.IsDemo, unit.Beds);
}
