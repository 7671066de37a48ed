using System.Buffers.Text;
using System.Security.Cryptography;
using Microsoft.AspNetCore.Identity;
using Microsoft.EntityFrameworkCore;
using Microsoft.Extensions.DependencyInjection;
using NodaTime;
using UnitVent.Charting.Results;
using UnitVent.Store.Auditing;
using UnitVent.Store.Model;
using UnitVent.Store.Units;

namespace UnitVent.Store.People;

/// <summary>Makes the first administrator, unit and beds, once, for whoever has the one-time secret.</summary>
public sealed class SetUpDesk
{
    private const int TheOnlyRow = 1;
    private const int SecretBytes = 20;

    private readonly IServiceScopeFactory scopes;
    private readonly UnitScope scope;
    private readonly IClock clock;

    internal SetUpDesk(IServiceScopeFactory scopes, UnitScope scope, IClock clock) => (this.scopes, this.scope, this.clock) = (scopes, scope, clock);

    /// <summary>Whether nobody can sign in yet.</summary>
    public Task<Result<bool>> IsNeededAsync(CancellationToken cancellationToken) =>
        scope.OutsideAsync(async db => Result<bool>.Of(!await db.Users.AnyAsync(cancellationToken)), cancellationToken);

    /// <summary>Makes a new one-time secret; an earlier one is good no longer.</summary>
    /// <returns>The secret, for the only time; refused when set-up is done.</returns>
    public Task<Result<string>> IssueSecretAsync(CancellationToken cancellationToken) => scope.OutsideAsync(
        async db =>
        {
            if (await db.Users.AnyAsync(cancellationToken))
            {
                return Done<string>();
            }

            var secret = Base64Url.EncodeToString(RandomNumberGenerator.GetBytes(SecretBytes));
            var row = await db.SetUps.FirstOrDefaultAsync(s => s.Id == TheOnlyRow, cancellationToken);
            if (row is null)
            {
                row = new SetUpRow { Id = TheOnlyRow };
                db.SetUps.Add(row);
            }

            row.SecretHash = TokenDesk.HashOf(secret);
            await db.SaveChangesAsync(cancellationToken);
            return Result<string>.Of(secret);
        },
        cancellationToken);

    /// <summary>Makes the first administrator, who is also the unit's physician, and the first unit with its beds; all or nothing.</summary>
    public Task<Result<bool>> CompleteAsync(string secret, string userName, string displayName, string password, NewUnit unit, CancellationToken cancellationToken) =>
        UnitScope.GuardedAsync(async () =>
        {
            await using var services = scopes.CreateAsyncScope();
            var users = services.ServiceProvider.GetRequiredService<UserManager<Account>>();
            var db = services.ServiceProvider.GetRequiredService<Schema.UnitVentDbContext>();
            await using var transaction = await db.Database.BeginTransactionAsync(cancellationToken);
            var row = await db.SetUps.FromSql($"select * from set_up where id = {TheOnlyRow} for update").FirstOrDefaultAsync(cancellationToken);
            if (row is null || row.DoneAt is not null || await db.Users.AnyAsync(cancellationToken))
            {
                return Done<bool>();
            }

            if (!CryptographicOperations.FixedTimeEquals(row.SecretHash, TokenDesk.HashOf(secret)))
            {
                return Result<bool>.Refused(Refusal.Value, "secret", "secret.wrong", "The set-up secret is not the one that was printed.");
            }

            row.DoneAt = clock.GetCurrentInstant();
            var account = new Account { Id = Guid.CreateVersion7(), UserName = userName.Trim(), DisplayName = displayName.Trim(), IsAdministrator = true };
            await UnitScope.NameUnitAsync(db, AuditTrail.Everywhere, cancellationToken);
            var made = UserDesk.Checked(await users.CreateAsync(account, password), account.Id);
            var added = UnitDesk.Add(db, unit, new Actor(account.Id, account.DisplayName, true, new Dictionary<Guid, UnitRole>()), row.DoneAt.Value);
            if (!made.Succeeded || !added.Succeeded)
            {
                return Result<bool>.Refused(Refusal.Value, [.. made.Errors, .. added.Errors]);
            }

            db.Memberships.Add(new MembershipRow { UnitId = added.Value, UserId = account.Id, Role = UnitRole.Physician });
            await db.SaveChangesAsync(cancellationToken);
            await UnitScope.CommitAsync(transaction);
            return Result<bool>.Of(true);
        });

    private static Result<T> Done<T>() => Result<T>.Refused(Refusal.Conflict, "", "set-up.done", "Set-up was done already.");
}
