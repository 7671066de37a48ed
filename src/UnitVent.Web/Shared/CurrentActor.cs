using System.Security.Claims;
using Microsoft.AspNetCore.Components.Authorization;
using UnitVent.Store.People;
using UnitVent.Web.Account;

namespace UnitVent.Web.Shared;

/// <summary>Who acts in this circuit, as the store knows the person at this moment: a role taken away is gone at the next action.</summary>
/// <remarks>Ask for it at the beginning of every action; do not keep it.</remarks>
public sealed class CurrentActor(UserDesk users, AuthenticationStateProvider session, EndedSessions ended)
{
    /// <summary>Somebody who may do nothing and sees no unit.</summary>
    public static Actor Nobody { get; } = new(null, "", false, new Dictionary<Guid, UnitRole>());

    public async Task<Actor> GetAsync(CancellationToken cancel = default)
    {
        var person = (await session.GetAuthenticationStateAsync()).User;
        return SessionClaims.SessionOf(person) is { } id && !ended.Contains(id) ? await OfAsync(users, person, cancel) : Nobody;
    }

    /// <summary>Who a signed-in person is now; nobody when there is no such person any more.</summary>
    public static async Task<Actor> OfAsync(UserDesk users, ClaimsPrincipal person, CancellationToken cancel)
    {
        if (SessionClaims.UserIdOf(person) is not { } userId)
        {
            return Nobody;
        }

        var actor = await users.ActorAsync(userId, cancel);
        return actor.Succeeded ? actor.Value : Nobody;
    }
}
