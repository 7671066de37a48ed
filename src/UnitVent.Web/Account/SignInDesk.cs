using Microsoft.AspNetCore.Authentication;
using Microsoft.AspNetCore.Identity;
using NodaTime;
using UnitVent.Charting.Results;
using UnitVent.Store.Auditing;
using UserAccount = UnitVent.Store.People.Account;

namespace UnitVent.Web.Account;

/// <summary>Signs people in and out and changes their passwords; every attempt is in the audit trail.</summary>
public sealed class SignInDesk(SignInManager<UserAccount> signIn, AuditTrail audit, EndedSessions ended, IClock clock)
{
    private static readonly UserAccount Stranger = new() { UserName = "stranger" };

    private UserManager<UserAccount> Users => signIn.UserManager;

    /// <summary>Signs in. Whether the name is unknown, the password wrong, or the account disabled or held for a minute, the caller is not told.</summary>
    public async Task<SignInAnswer> SignInAsync(HttpContext http, string userName, string password)
    {
        try
        {
            return await TryAsync(http, userName, password) ? SignInAnswer.SignedIn : SignInAnswer.DoesNotFit;
        }
        catch (Exception e) when (StoreTrouble.Is(e))
        {
            return SignInAnswer.StoreIsAway;
        }
    }

    public async Task SignOutAsync(HttpContext http)
    {
        if (SessionClaims.SessionOf(http.User) is { } session)
        {
            ended.Add(session);
            await KeepAsync(SessionClaims.NameOf(http.User), "sign-out", SessionClaims.UserIdOf(http.User), http);
        }

        await http.SignOutAsync(IdentityConstants.ApplicationScheme);
        http.Response.Headers["Clear-Site-Data"] = "\"cache\", \"storage\"";
    }

    /// <summary>Changes the password of whoever is signed in; every other session of the person ends.</summary>
    /// <returns>What speaks against it; empty when it was changed.</returns>
    public async Task<IReadOnlyList<string>> ChangePasswordAsync(HttpContext http, string old, string wanted)
    {
        if (await Users.GetUserAsync(http.User) is not { } account)
        {
            return ["You are signed out."];
        }

        account.MustChangePassword = false;
        var changed = await Users.ChangePasswordAsync(account, old, wanted);
        if (!changed.Succeeded)
        {
            return [.. changed.Errors.Select(e => e.Description)];
        }

        await KeepAsync(account.DisplayName, "change-password", account.Id, http);
        await BeginAsync(http, account);
        return [];
    }

    private async Task<bool> TryAsync(HttpContext http, string userName, string password)
    {
        var account = await Users.FindByNameAsync(userName);
        if (account is null)
        {
            Users.PasswordHasher.HashPassword(Stranger, password); // takes as long as a known name would
            await KeepAsync("unknown", "sign-in-failed", null, http);
            return false;
        }

        var checkedPassword = await signIn.CheckPasswordSignInAsync(account, password, lockoutOnFailure: true);
        if (!checkedPassword.Succeeded || account.Disabled)
        {
            await KeepAsync(account.DisplayName, "sign-in-failed", account.Id, http);
            return false;
        }

        await BeginAsync(http, account);
        await KeepAsync(account.DisplayName, "sign-in", account.Id, http);
        return true;
    }

    private async Task BeginAsync(HttpContext http, UserAccount account)
    {
        var person = await signIn.CreateUserPrincipalAsync(account);
        SessionClaims.Begin(person, account.DisplayName, account.MustChangePassword, clock.GetCurrentInstant());
        await http.SignInAsync(IdentityConstants.ApplicationScheme, person);
    }

    private Task<Result<bool>> KeepAsync(string who, string what, Guid? subject, HttpContext http) =>
        audit.AppendAsync(AuditTrail.Everywhere, who, what, subject, http.Connection.RemoteIpAddress?.ToString() ?? "", http.RequestAborted);
}
