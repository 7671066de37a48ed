using System.Threading.RateLimiting;

namespace UnitVent.Web.Hosting;

/// <summary>How often one address may try what costs much or could be guessed.</summary>
public static class RateLimits
{
    public const string SignIn = "sign-in";
    public const string Sheets = "sheets";

    private const int SignInsPerMinute = 30;
    private const int SheetsPerMinute = 60;

    public static void AddRateLimits(this IServiceCollection services) => services.AddRateLimiter(limiter =>
    {
        limiter.RejectionStatusCode = StatusCodes.Status429TooManyRequests;
        limiter.AddPolicy(SignIn, http => HttpMethods.IsPost(http.Request.Method) ? PerAddress(http, SignInsPerMinute) : RateLimitPartition.GetNoLimiter(""));
        limiter.AddPolicy(Sheets, http => PerAddress(http, SheetsPerMinute));
    });

    private static RateLimitPartition<string> PerAddress(HttpContext http, int perMinute) =>
        RateLimitPartition.GetFixedWindowLimiter(http.Connection.RemoteIpAddress?.ToString() ?? "", _ => new FixedWindowRateLimiterOptions
        {
            PermitLimit = perMinute,
            Window = TimeSpan.FromMinutes(1),
        });
}
