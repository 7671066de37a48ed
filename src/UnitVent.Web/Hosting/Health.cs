namespace UnitVent.Web.Hosting;

/// <summary>Whether the process runs, and whether it can work. No detail: anybody may ask.</summary>
public static class Health
{
    public static void MapHealth(this IEndpointRouteBuilder routes)
    {
        routes.MapGet("/livez", () => "ok").AllowAnonymous();
        routes.MapGet("/readyz", () => "ok").AllowAnonymous();
    }
}
