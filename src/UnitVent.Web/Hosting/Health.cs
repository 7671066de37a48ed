using UnitVent.Store.People;

namespace UnitVent.Web.Hosting;

/// <summary>Whether the process runs, and whether it can work. No detail: anybody may ask.</summary>
public static class Health
{
    public static void MapHealth(this IEndpointRouteBuilder routes)
    {
        routes.MapGet("/livez", () => "ok").AllowAnonymous().ExcludeFromDescription();
        routes.MapGet("/readyz", ReadyAsync).AllowAnonymous().ExcludeFromDescription();
    }

    private static async Task<IResult> ReadyAsync(SetUpDesk store, CancellationToken cancel) =>
        (await store.IsNeededAsync(cancel)).Succeeded ? TypedResults.Text("ok") : TypedResults.Text("not ready", statusCode: StatusCodes.Status503ServiceUnavailable);
}
