namespace UnitVent.Web.Hosting;

/// <summary>The way of a request through the program.</summary>
public static class WebPipeline
{
    public static void UseWeb(this WebApplication app)
    {
        app.UseForwardedHeaders();
        app.UseSecurityHeaders();
        app.UseExceptionHandler("/failed");
        app.UseHsts();
        app.UseSameOriginCircuits();
        app.UseCookiePolicy();
        app.UseRateLimiter();
        app.UseAuthentication();
        app.UseAuthorization();
        app.UseAntiforgery();
        app.MapStaticAssets().AllowAnonymous();
        app.MapHealth();
        app.MapRazorComponents<App>().AddInteractiveServerRenderMode(circuits =>
        {
            circuits.DisableWebSocketCompression = true;
            circuits.ContentSecurityFrameAncestorsPolicy = null;
        });
    }
}
