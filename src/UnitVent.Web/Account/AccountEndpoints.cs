using Microsoft.AspNetCore.Mvc;
using UnitVent.Web.Hosting;

namespace UnitVent.Web.Account;

/// <summary>What the header of every page needs: leaving, and saying that somebody is still there.</summary>
public static class AccountEndpoints
{
    public static void MapAccount(this IEndpointRouteBuilder routes)
    {
        routes.MapPost("/sign-out", LeaveAsync).RequireAuthorization(Policies.SignedIn).ExcludeFromDescription();
        routes.MapGet("/still-here", () => TypedResults.NoContent()).RequireAuthorization().ExcludeFromDescription();
    }

    private static async Task<IResult> LeaveAsync(HttpContext http, SignInDesk desk, [FromForm] string? then, [FromForm] string? back)
    {
        await desk.SignOutAsync(http);
        return TypedResults.LocalRedirect(then == "switch" ? "/sign-in?return=" + Uri.EscapeDataString(LocalPath.Of(back)) : "/sign-in");
    }
}
