using Microsoft.AspNetCore.Diagnostics;
using UnitVent.Web.Account;
using UnitVent.Web.Api;
using UnitVent.Web.Handover;

namespace UnitVent.Web.Hosting;

/// <summary>The way of a request through the program.</summary>
public static class WebPipeline
{
    public static void UseWeb(this WebApplication app)
    {
        app.UseForwardedHeaders();
        app.UseSecurityHeaders();
        app.UseHsts();
        app.UseWhen(IsApi, api => api.UseApiProblems());
        app.UseWhen(http => !IsApi(http), pages => pages.UseExceptionHandler("/failed").Use(ShowFailureAsPage));
        app.UseWhen(http => !IsApi(http) && HttpMethods.IsGet(http.Request.Method), pages => pages.UseStatusCodePagesWithReExecute("/not-found"));
        app.UseRouting();
        app.UseSameOriginCircuits();
        app.UseCookiePolicy();
        app.UseRateLimiter();
        app.UseAuthentication();
        app.UseAuthorization();
        app.UseAntiforgery();
        app.Map();
    }

    private static void Map(this WebApplication app)
    {
        app.MapStaticAssets().AllowAnonymous();
        app.MapHealth();
        app.MapAccount();
        app.MapApi();
        app.MapSheetPages();
        app.MapRazorComponents<App>().AddInteractiveServerRenderMode(circuits =>
        {
            circuits.DisableWebSocketCompression = true;
            circuits.ContentSecurityFrameAncestorsPolicy = null;
        });
    }

    /// <summary>The page that says so is read, not sent: a form that failed is not sent to it once more.</summary>
    private static Task ShowFailureAsPage(HttpContext http, RequestDelegate next)
    {
        if (http.Features.Get<IExceptionHandlerFeature>() is not null)
        {
            http.Request.Method = HttpMethods.Get;
        }

        return next(http);
    }

    private static bool IsApi(HttpContext http) => http.Request.Path.StartsWithSegments(ApiEndpoints.Root);
}
