namespace UnitVent.Web.Hosting;

/// <summary>The headers that every response carries.</summary>
public static class SecurityHeaders
{
    private const string CircuitPath = "/_blazor";

    public static IApplicationBuilder UseSecurityHeaders(this IApplicationBuilder app) => app.Use((http, next) =>
    {
        http.Response.OnStarting(Write, http);
        return next(http);
    });

    /// <summary>A page from elsewhere may not open a circuit with the reader's cookie.</summary>
    public static IApplicationBuilder UseSameOriginCircuits(this IApplicationBuilder app) => app.Use((http, next) =>
    {
        if (!http.Request.Path.StartsWithSegments(CircuitPath) || IsSameOrigin(http.Request))
        {
            return next(http);
        }

        http.Response.StatusCode = StatusCodes.Status403Forbidden;
        return Task.CompletedTask;
    });

    private static bool IsSameOrigin(HttpRequest request) =>
        request.Headers.Origin.ToString() is not { Length: > 0 } origin || origin == $"{request.Scheme}://{request.Host}";

    private static Task Write(object state)
    {
        var http = (HttpContext)state;
        var headers = http.Response.Headers;
        headers.ContentSecurityPolicy = http.Response.ContentType == "application/pdf" ? ContentSecurity.ForSheets : ContentSecurity.PolicyFor(http);
        headers.XContentTypeOptions = "nosniff";
        headers["Referrer-Policy"] = "no-referrer";
        headers["Permissions-Policy"] = "camera=(), geolocation=(), microphone=(), payment=(), usb=()";
        headers["Cross-Origin-Opener-Policy"] = "same-origin";
        if (!IsStatic(http))
        {
            headers.CacheControl = "no-store";
        }

        return Task.CompletedTask;
    }

    /// <summary>Files that come with the program say themselves how long they keep; everything else may hold a patient's data.</summary>
    private static bool IsStatic(HttpContext http) =>
        http.GetEndpoint()?.Metadata.GetMetadata<Microsoft.AspNetCore.StaticAssets.StaticAssetDescriptor>() is not null
        && http.Response.StatusCode is StatusCodes.Status200OK or StatusCodes.Status304NotModified;
}
