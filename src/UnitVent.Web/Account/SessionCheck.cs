using System.Security.Claims;
using Microsoft.AspNetCore.Identity;
using Microsoft.Extensions.Options;
using NodaTime;
using UserAccount = UnitVent.Store.People.Account;

namespace UnitVent.Web.Account;

/// <summary>Whether a session still stands: not signed out, not older than a shift, its person neither disabled nor changed since.</summary>
public sealed class SessionCheck(EndedSessions ended, IServiceScopeFactory scopes, IOptions<IdentityOptions> options, IClock clock)
{
    /// <summary>The longest session, however busy.</summary>
    public static readonly Duration Longest = Duration.FromHours(12);

    public async Task<bool> StandsAsync(ClaimsPrincipal person)
    {
        if (SessionClaims.SessionOf(person) is not { } session || SessionClaims.UserIdOf(person) is not { } userId
            || ended.Contains(session) || clock.GetCurrentInstant() - SessionClaims.BeginOf(person) > Longest)
        {
            return false;
        }

        try
        {
            await using var scope = scopes.CreateAsyncScope();
            var account = await scope.ServiceProvider.GetRequiredService<UserManager<UserAccount>>().FindByIdAsync(userId.ToString());
            return account is { Disabled: false } && account.SecurityStamp == person.FindFirstValue(options.Value.ClaimsIdentity.SecurityStampClaimType);
        }
        catch (Exception e) when (StoreTrouble.Is(e))
        {
            // The store is away: whoever is in stays in; nothing can be read or written meanwhile.
            return true;
        }
    }
}
