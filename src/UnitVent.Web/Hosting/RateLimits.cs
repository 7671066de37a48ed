using System.Threading.RateLimiting;
using Microsoft.AspNetCore.RateLimiting;
using UnitVent.Web.Api;

namespace UnitVent.Web.Hosting;

/// <summary>How often one address may try what costs much or could be guessed.</summary>
public static class RateLimits
{
    public const string Api = "api";
    public const string SignIn = "sign-in";
    public const string Sheets = "sheets";

    private const int CallsPerMinute = 1200;
    private const int SignInsPerMinute = 30;
    private const int SheetsPerMinute = 60;

    public static void AddRateLimits(this IServiceCollection services) => services.AddRateLimiter(limiter =>
    {
        limiter.OnRejected = (rejected, _) => new ValueTask(AnswerAsync(rejected));
        limiter.AddPolicy(SignIn, http => HttpMethods.IsPost(http.Request.Method) ? PerAddress(http, SignInsPerMinute) : RateLimitPartition.GetNoLimiter(""));
        limiter.AddPolicy(Api, http => PerAddress(http, CallsPerMinute));
        limiter.AddPolicy(Sheets, http => PerAddress(http, SheetsPerMinute));
    });

    private static RateLimitPartition<string> PerAddress(HttpContext http, int perMinute) =>
        RateLimitPartition.GetFixedWindowLimiter(http.Connection.RemoteIpAddress?.ToString() ?? "", _ => new FixedWindowRateLimiterOptions
        {
            PermitLimit = perMinute,
            Window = TimeSpan.FromMinutes(1),
        });

    private static Task AnswerAsync(OnRejectedContext rejected)
    {
        var http = rejected.HttpContext;
        http.Response.Headers.RetryAfter = "60";
        return http.Request.Path.StartsWithSegments(ApiEndpoints.Root)
            ? Problems.TooMany().ExecuteAsync(http)
            : TypedResults.Text("Too many tries from this address. Wait a minute.", statusCode: StatusCodes.Status429TooManyRequests).ExecuteAsync(http);
    }
}
