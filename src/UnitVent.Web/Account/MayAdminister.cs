using Microsoft.AspNetCore.Authorization;
using UnitVent.Store.People;
using UnitVent.Web.Shared;

namespace UnitVent.Web.Account;

/// <summary>Opens the administration page: to administrators, and to whoever keeps the beds of a unit.</summary>
public sealed class MayAdminister : IAuthorizationRequirement;

/// <summary>Asks the store what the person is now.</summary>
public sealed class MayAdministerHandler(UserDesk users) : AuthorizationHandler<MayAdminister>
{
    protected override async Task HandleRequirementAsync(AuthorizationHandlerContext context, MayAdminister requirement)
    {
        var actor = await CurrentActor.OfAsync(users, context.User, CancellationToken.None);
        if (actor.IsAdministrator || actor.Units.Values.Any(role => Permissions.Allows(role, Operation.ManageBeds)))
        {
            context.Succeed(requirement);
        }
    }
}
