using System.Security.Cryptography;
using Microsoft.AspNetCore.Identity;
using Microsoft.EntityFrameworkCore;
using Microsoft.Extensions.DependencyInjection;
using NodaTime;
using UnitVent.Charting.Results;
using UnitVent.Store.Auditing;
using UnitVent.Store.Model;
using UnitVent.Store.Schema;

namespace UnitVent.Store.People;

/// <summary>Keeps the people who sign in, and what they are in which unit.</summary>
public sealed class UserDesk
{
    private const int LongestName = 120;
    private const int OneTimeCodeLength = 20;
    private const string CodeAlphabet = "abcdefghjkmnpqrstuvwxyz23456789";

    private readonly IServiceScopeFactory scopes;
    private readonly UnitScope scope;
    private readonly IClock clock;

    internal UserDesk(IServiceScopeFactory scopes, UnitScope scope, IClock clock) => (this.scopes, this.scope, this.clock) = (scopes, scope, clock);

    /// <summary>The program itself, for the command line: it may administer.</summary>
    public static Actor CommandLine { get; } = new(null, "command line", true, new Dictionary<Guid, UnitRole>());

    /// <summary>Makes a person.</summary>
    /// <param name="actor">An administrator.</param>
    /// <param name="userName">The name to sign in with.</param>
    /// <param name="displayName">The name on screens and entries; 1–120 characters.</param>
    /// <param name="password">The first password; null for a one-time code that has to be changed.</param>
    /// <param name="isAdministrator">Whether the person administers.</param>
    /// <param name="cancellationToken">Gives up.</param>
    /// <returns>The password or one-time code to hand over, and the person's id.</returns>
    public Task<Result<NewPerson>> CreateAsync(
        Actor actor, string userName, string displayName, string? password, bool isAdministrator, CancellationToken cancellationToken) =>
        ManagedAsync(actor, "create-user", async users =>
        {
            if (string.IsNullOrWhiteSpace(displayName) || displayName.Trim().Length > LongestName)
            {
                return Refusals.Missing<NewPerson>("displayName", $"A name of 1–{LongestName} characters is needed.");
            }

            var account = new Account
            {
                Id = Guid.CreateVersion7(),
                UserName = userName.Trim(),
                DisplayName = displayName.Trim(),
                IsAdministrator = isAdministrator,
                MustChangePassword = password is null,
            };
            var secret = password ?? OneTimeCode();
            return Checked(await users.CreateAsync(account, secret), new NewPerson(account.Id, secret));
        }, person => person.Id, cancellationToken);

    /// <summary>Gives a person a one-time code that has to be changed at the next sign-in.</summary>
    /// <returns>The code, for the only time.</returns>
    public Task<Result<NewPerson>> ResetPasswordAsync(Actor actor, string userName, CancellationToken cancellationToken) =>
        ManagedAsync(actor, "reset-password", async users =>
            await users.FindByNameAsync(userName) is { } account ? await ChangeAsync(users, account, OneTimeCode(), true) : Refusals.NotFound<NewPerson>("user"), person => person.Id, cancellationToken);

    /// <summary>Gives a person a password that need not be changed.</summary>
    public Task<Result<NewPerson>> SetPasswordAsync(Actor actor, Guid userId, string password, CancellationToken cancellationToken) =>
        ManagedAsync(actor, "set-password", async users =>
            await users.FindByIdAsync(userId.ToString()) is { } account ? await ChangeAsync(users, account, password, false) : Refusals.NotFound<NewPerson>("user"), person => person.Id, cancellationToken);

    /// <summary>Lets a person sign in no longer, or again. What is open ends within a minute.</summary>
    public Task<Result<bool>> SetDisabledAsync(Actor actor, Guid userId, bool disabled, CancellationToken cancellationToken) =>
        ManagedAsync(actor, disabled ? "disable-user" : "enable-user", async users =>
        {
            if (await users.FindByIdAsync(userId.ToString()) is not { } account)
            {
                return Refusals.NotFound<bool>("user");
            }

            account.Disabled = disabled;
            return Checked(await users.UpdateSecurityStampAsync(account), true);
        }, _ => userId, cancellationToken);

    /// <summary>Makes a person something in a unit; null takes the membership away.</summary>
    public Task<Result<bool>> SetMembershipAsync(Actor actor, Guid userId, string unitCode, UnitRole? role, CancellationToken cancellationToken) =>
        !actor.IsAdministrator ? Task.FromResult(Refusals.Denied<bool>()) : scope.OutsideAsync(
            async db =>
            {
                var unit = await db.Units.AsNoTracking().FirstOrDefaultAsync(u => u.Code == unitCode, cancellationToken);
                if (unit is null || !await db.Users.AnyAsync(u => u.Id == userId, cancellationToken))
                {
                    return Refusals.NotFound<bool>("unit or user");
                }

                await db.Memberships.Where(m => m.UnitId == unit.Id && m.UserId == userId).ExecuteDeleteAsync(cancellationToken);
                if (role is { } wanted)
                {
                    db.Memberships.Add(new MembershipRow { UnitId = unit.Id, UserId = userId, Role = wanted });
                }

                AuditTrail.Add(db, AuditTrail.Everywhere, clock.GetCurrentInstant(), actor, "membership", userId, $"{unitCode} {role?.ToString() ?? "none"}");
                await db.SaveChangesAsync(cancellationToken);
                return Result<bool>.Of(true);
            },
            cancellationToken);

    /// <summary>The people, by user name.</summary>
    public Task<Result<IReadOnlyList<Person>>> ListAsync(Actor actor, CancellationToken cancellationToken) =>
        !actor.IsAdministrator ? Task.FromResult(Refusals.Denied<IReadOnlyList<Person>>()) : scope.OutsideAsync(
            async db =>
            {
                var accounts = await db.Users.AsNoTracking().OrderBy(u => u.UserName).ToListAsync(cancellationToken);
                var roles = await db.Memberships.AsNoTracking().Join(db.Units, m => m.UnitId, u => u.Id, (m, u) => new { m.UserId, u.Code, m.Role }).ToListAsync(cancellationToken);
                var byUser = roles.ToLookup(r => r.UserId);
                return Result<IReadOnlyList<Person>>.Of([.. accounts.Select(a =>
                    new Person(a.Id, a.UserName!, a.DisplayName, a.IsAdministrator, a.Disabled, byUser[a.Id].ToDictionary(r => r.Code, r => r.Role)))]);
            },
            cancellationToken);

    /// <summary>What a person is now; refused as not found when there is none or it was disabled.</summary>
    public Task<Result<Actor>> ActorAsync(Guid userId, CancellationToken cancellationToken) => scope.OutsideAsync(
        async db =>
        {
            var account = await db.Users.AsNoTracking().FirstOrDefaultAsync(u => u.Id == userId && !u.Disabled, cancellationToken);
            if (account is null)
            {
                return Refusals.NotFound<Actor>("user");
            }

            var roles = await db.Memberships.AsNoTracking().Where(m => m.UserId == userId).ToDictionaryAsync(m => m.UnitId, m => m.Role, cancellationToken);
            return Result<Actor>.Of(new Actor(userId, account.DisplayName, account.IsAdministrator, roles));
        },
        cancellationToken);

    /// <summary>Works with Identity as an administrator; what it did and its audit row are one transaction.</summary>
    private Task<Result<T>> ManagedAsync<T>(
        Actor actor, string what, Func<UserManager<Account>, Task<Result<T>>> work, Func<T, Guid> subject, CancellationToken cancellationToken) =>
        !actor.IsAdministrator ? Task.FromResult(Refusals.Denied<T>()) : UnitScope.GuardedAsync(async () =>
        {
            await using var services = scopes.CreateAsyncScope();
            var db = services.ServiceProvider.GetRequiredService<UnitVentDbContext>();
            await using var transaction = await db.Database.BeginTransactionAsync(cancellationToken);
            await UnitScope.NameUnitAsync(db, AuditTrail.Everywhere, cancellationToken);
            var result = await work(services.ServiceProvider.GetRequiredService<UserManager<Account>>());
            if (result.Succeeded)
            {
                AuditTrail.Add(db, AuditTrail.Everywhere, clock.GetCurrentInstant(), actor, what, subject(result.Value), "");
                await db.SaveChangesAsync(cancellationToken);
                await UnitScope.CommitAsync(transaction);
            }

            return result;
        });

    private static async Task<Result<NewPerson>> ChangeAsync(UserManager<Account> users, Account account, string password, bool oneTime)
    {
        account.MustChangePassword = oneTime;
        account.LockoutEnd = null;
        var changed = await users.ResetPasswordAsync(account, await users.GeneratePasswordResetTokenAsync(account), password);
        return Checked(changed, new NewPerson(account.Id, password));
    }

    internal static Result<T> Checked<T>(IdentityResult done, T value) => done.Succeeded
        ? Result<T>.Of(value)
        : Result<T>.Refused(Refusal.Value, [.. done.Errors.Select(e => new FieldError(FieldOf(e.Code), "account." + e.Code, e.Description))]);

    private static string FieldOf(string identityCode) => identityCode.Contains("Password", StringComparison.Ordinal) ? "password" : "userName";

    private static string OneTimeCode() => RandomNumberGenerator.GetString(CodeAlphabet, OneTimeCodeLength);
}
