using System.Security.Claims;
using System.Text.Encodings.Web;
using Microsoft.AspNetCore.Authentication;
using Microsoft.Extensions.Options;
using UnitVent.Charting.Results;
using UnitVent.Store.People;

namespace UnitVent.Web.Api;

/// <summary>Recognises the bearer tokens of the HTTP interface, in the header only.</summary>
public sealed class BearerTokens(IOptionsMonitor<AuthenticationSchemeOptions> options, ILoggerFactory logs, UrlEncoder encoder, TokenDesk tokens)
    : AuthenticationHandler<AuthenticationSchemeOptions>(options, logs, encoder)
{
    public new const string Scheme = "Bearer";

    private const string Prefix = "Bearer ";
    private bool storeIsAway;

    protected override async Task<AuthenticateResult> HandleAuthenticateAsync()
    {
        if (Request.Headers.Authorization.ToString() is not { } header || !header.StartsWith(Prefix, StringComparison.OrdinalIgnoreCase))
        {
            return AuthenticateResult.NoResult();
        }

        var actor = await tokens.AuthenticateAsync(header[Prefix.Length..].Trim(), Context.RequestAborted);
        storeIsAway = actor.Refusal == Refusal.Unavailable;
        if (!actor.Succeeded)
        {
            return AuthenticateResult.Fail("Unknown, revoked or expired.");
        }

        Context.Features.Set(actor.Value);
        var person = new ClaimsPrincipal(new ClaimsIdentity([new Claim(ClaimTypes.Name, actor.Value.Name)], Scheme));
        return AuthenticateResult.Success(new AuthenticationTicket(person, Scheme));
    }

    protected override Task HandleChallengeAsync(AuthenticationProperties properties)
    {
        Response.Headers.WWWAuthenticate = Scheme;
        return (storeIsAway ? Problems.StoreIsAway() : Problems.Unknown()).ExecuteAsync(Context);
    }
}
