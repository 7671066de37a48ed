using Microsoft.AspNetCore.Antiforgery;
using Microsoft.AspNetCore.CookiePolicy;
using Microsoft.AspNetCore.HttpOverrides;
using MudBlazor.Services;
using UnitVent.Web.Account;
using UnitVent.Web.Admin;
using UnitVent.Web.Api;
using UnitVent.Web.Handover;
using UnitVent.Web.Shared;

namespace UnitVent.Web.Hosting;

/// <summary>What the web application is made of.</summary>
public static class WebServices
{
    private const int BodyLimitBytes = 64 * 1024;
    private const int HubMessageLimitBytes = 32 * 1024;

    public static void AddWeb(this WebApplicationBuilder builder)
    {
        builder.Logging.AddFilter("Microsoft", LogLevel.Warning).AddFilter("Microsoft.Hosting.Lifetime", LogLevel.Information);
        builder.WebHost.UseStaticWebAssets();
        builder.WebHost.ConfigureKestrel(kestrel =>
        {
            kestrel.AddServerHeader = false;
            kestrel.Limits.MaxRequestBodySize = BodyLimitBytes;
        });
        builder.Services.AddScreens();
        builder.Services.AddAccounts();
        builder.Services.AddCookieRules();
        builder.Services.Configure<ForwardedHeadersOptions>(o => o.ForwardedHeaders = ForwardedHeaders.XForwardedFor | ForwardedHeaders.XForwardedProto);
        builder.Services.AddHsts(hsts => (hsts.MaxAge, hsts.IncludeSubDomains) = (TimeSpan.FromDays(365), true));
        builder.Services.AddRateLimits();
        builder.Services.AddApi();
        builder.Services.AddSingleton<Sheets>();
    }

    private static void AddScreens(this IServiceCollection services)
    {
        services.AddRazorComponents().AddInteractiveServerComponents(circuit =>
        {
            circuit.DetailedErrors = false;
            circuit.DisconnectedCircuitMaxRetained = 200;
            circuit.DisconnectedCircuitRetentionPeriod = TimeSpan.FromMinutes(3);
            circuit.JSInteropDefaultCallTimeout = TimeSpan.FromSeconds(10);
            circuit.MaxBufferedUnacknowledgedRenderBatches = 10;
        }).AddHubOptions(hub => hub.MaximumReceiveMessageSize = HubMessageLimitBytes);
        services.AddMudServices();
        services.AddScoped<CircuitSession>();
        services.AddScoped<CurrentActor>();
        services.AddScoped<UnitInView>();
        services.AddScoped<AdminDesks>();
    }

    /// <summary>Every cookie is Secure. The antiforgery cookie would refuse plain HTTP on loopback if it were told so itself; the policy adds it.</summary>
    private static void AddCookieRules(this IServiceCollection services)
    {
        services.Configure<CookiePolicyOptions>(policy =>
        {
            policy.Secure = CookieSecurePolicy.Always;
            policy.HttpOnly = HttpOnlyPolicy.Always;
            policy.MinimumSameSitePolicy = SameSiteMode.Strict;
        });
        services.Configure<AntiforgeryOptions>(antiforgery =>
        {
            antiforgery.Cookie.Name = "__Host-form";
            antiforgery.Cookie.Path = "/";
            antiforgery.Cookie.SecurePolicy = CookieSecurePolicy.None;
            antiforgery.SuppressXFrameOptionsHeader = true;
        });
    }
}
