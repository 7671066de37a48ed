using Microsoft.AspNetCore.Authentication.Cookies;
using Microsoft.AspNetCore.Authorization;

namespace UnitVent.Web.Hosting;

/// <summary>Who may come in, and for how long.</summary>
public static class SignInServices
{
    private static readonly TimeSpan Idle = TimeSpan.FromMinutes(30);

    public static void AddSignIn(this IServiceCollection services)
    {
        services.AddAuthentication(CookieAuthenticationDefaults.AuthenticationScheme).AddCookie(cookie =>
        {
            cookie.Cookie.Name = "__Host-session";
            cookie.Cookie.Path = "/";
            cookie.Cookie.HttpOnly = true;
            cookie.Cookie.SecurePolicy = CookieSecurePolicy.Always;
            cookie.Cookie.SameSite = SameSiteMode.Strict;
            cookie.ExpireTimeSpan = Idle;
            cookie.SlidingExpiration = true;
            cookie.LoginPath = "/sign-in";
            cookie.AccessDeniedPath = "/no-access";
            cookie.ReturnUrlParameter = "return";
        });
        services.AddAuthorizationBuilder()
            .SetFallbackPolicy(new AuthorizationPolicyBuilder().RequireAuthenticatedUser().Build())
            .AddPolicy(Policies.Administer, policy => policy.RequireAuthenticatedUser());
        services.AddCascadingAuthenticationState();
    }
}
