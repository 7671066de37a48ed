using Microsoft.AspNetCore.Components.Authorization;
using Microsoft.AspNetCore.Components.Server;
using UnitVent.Web.Shared;

namespace UnitVent.Web.Account;

/// <summary>Asks every minute whether the person in front of a circuit may stay.</summary>
public sealed class CircuitAuthentication(ILoggerFactory logs, SessionCheck check, CircuitSession input) : RevalidatingServerAuthenticationStateProvider(logs)
{
    protected override TimeSpan RevalidationInterval => TimeSpan.FromMinutes(1);

    protected override async Task<bool> ValidateAuthenticationStateAsync(AuthenticationState authenticationState, CancellationToken cancellationToken) =>
        !input.IsIdle && await check.StandsAsync(authenticationState.User);
}
