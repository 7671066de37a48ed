using Microsoft.AspNetCore.Authentication;
using Microsoft.AspNetCore.Authentication.Cookies;
using Microsoft.AspNetCore.Authorization;
using Microsoft.AspNetCore.Components.Authorization;
using Microsoft.AspNetCore.Identity;
using UnitVent.Web.Api;
using UnitVent.Web.Hosting;

namespace UnitVent.Web.Account;

/// <summary>Who may come in, how, and for how long.</summary>
public static class AccountServices
{
    private static readonly TimeSpan Idle = TimeSpan.FromMinutes(30);
    private static readonly TimeSpan RenewedAtMostEvery = TimeSpan.FromMinutes(1);

    public static void AddAccounts(this IServiceCollection services)
    {
        services.AddSingleton<EndedSessions>();
        services.AddSingleton<SessionCheck>();
        services.AddScoped<SignInDesk>();
        services.AddAuthentication(IdentityConstants.ApplicationScheme)
            .AddCookie(IdentityConstants.ApplicationScheme, Configure)
            .AddScheme<AuthenticationSchemeOptions, BearerTokens>(BearerTokens.Scheme, null);
        services.AddAuthorizationBuilder()
            .SetDefaultPolicy(Session().Build())
            .SetFallbackPolicy(Session().Build())
            .AddPolicy(Policies.SignedIn, policy => policy.RequireAuthenticatedUser())
            .AddPolicy(Policies.Administer, policy => policy.Combine(Session().Build()).AddRequirements(new MayAdminister()))
            .AddPolicy(Policies.Token, policy => policy.AddAuthenticationSchemes(BearerTokens.Scheme).RequireAuthenticatedUser())
            .AddPolicy(Policies.SessionOrToken, policy => policy
                .AddAuthenticationSchemes(IdentityConstants.ApplicationScheme, BearerTokens.Scheme).RequireAuthenticatedUser());
        services.AddScoped<IAuthorizationHandler, MayAdministerHandler>();
        services.AddCascadingAuthenticationState();
        services.AddScoped<AuthenticationStateProvider, CircuitAuthentication>();
    }

    /// <summary>A person whose password is a one-time code gets no further than the page that changes it.</summary>
    private static AuthorizationPolicyBuilder Session() => new AuthorizationPolicyBuilder()
        .RequireAuthenticatedUser()
        .RequireAssertion(context => !context.User.HasClaim(c => c.Type == SessionClaims.MustChangePassword));

    private static void Configure(CookieAuthenticationOptions cookie)
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
        cookie.Events.OnCheckSlidingExpiration = context =>
        {
            context.ShouldRenew = context.ElapsedTime > RenewedAtMostEvery;
            return Task.CompletedTask;
        };
        cookie.Events.OnValidatePrincipal = async context =>
        {
            if (!await context.HttpContext.RequestServices.GetRequiredService<SessionCheck>().StandsAsync(context.Principal!))
            {
                context.RejectPrincipal();
                await context.HttpContext.SignOutAsync(IdentityConstants.ApplicationScheme);
            }
        };
        cookie.Events.OnRedirectToAccessDenied = context =>
        {
            var mustChange = context.HttpContext.User.HasClaim(c => c.Type == SessionClaims.MustChangePassword);
            context.Response.Redirect(mustChange ? "/account/password" : context.RedirectUri);
            return Task.CompletedTask;
        };
    }
}
