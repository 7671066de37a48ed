using System.Buffers.Text;
using System.Security.Cryptography;
using System.Text;
using Microsoft.EntityFrameworkCore;
using NodaTime;
using UnitVent.Charting.Results;
using UnitVent.Store.Auditing;
using UnitVent.Store.Model;

namespace UnitVent.Store.People;

/// <summary>Makes, lists, revokes and recognises tokens of the HTTP interface. A token is shown once and stored as a hash.</summary>
public sealed class TokenDesk
{
    private const int RandomBytes = 32;
    private const string Prefix = "uv_";

    private static readonly Duration Longest = Duration.FromDays(365);
    private static readonly Duration UseNoticedEvery = Duration.FromMinutes(5);

    private readonly UnitScope scope;
    private readonly IClock clock;

    internal TokenDesk(UnitScope scope, IClock clock) => (this.scope, this.clock) = (scope, clock);

    /// <summary>Makes a token for a unit.</summary>
    /// <param name="actor">Who makes it: an administrator.</param>
    /// <param name="unitCode">The unit.</param>
    /// <param name="role">What the token is in it.</param>
    /// <param name="name">What it is for; entries carry it.</param>
    /// <param name="validFor">How long; null for a year, which is the longest.</param>
    /// <param name="cancellationToken">Gives up.</param>
    /// <returns>The token, for the only time.</returns>
    public Task<Result<string>> CreateAsync(Actor actor, string unitCode, UnitRole role, string name, Duration? validFor, CancellationToken cancellationToken) =>
        !actor.IsAdministrator ? Task.FromResult(Refusals.Denied<string>()) : string.IsNullOrWhiteSpace(name)
            ? Task.FromResult(Result<string>.Refused(Refusal.Value, "name", "missing", "A token needs a name."))
            : scope.OutsideAsync(
                async db =>
                {
                    var unit = await db.Units.AsNoTracking().Where(u => u.Code == unitCode).Select(u => (Guid?)u.Id).FirstOrDefaultAsync(cancellationToken);
                    if (unit is not { } unitId)
                    {
                        return Refusals.NotFound<string>("unit");
                    }

                    var now = clock.GetCurrentInstant();
                    var token = Prefix + Base64Url.EncodeToString(RandomNumberGenerator.GetBytes(RandomBytes));
                    var row = new ApiTokenRow
                    {
                        Id = Guid.CreateVersion7(),
                        UnitId = unitId,
                        Role = role,
                        Name = name.Trim(),
                        Hash = HashOf(token),
                        CreatedAt = now,
                        ExpiresAt = now + Duration.Min(validFor ?? Longest, Longest),
                    };
                    db.ApiTokens.Add(row);
                    AuditTrail.Add(db, AuditTrail.Everywhere, now, actor, "create-token", row.Id, role.ToString());
                    await db.SaveChangesAsync(cancellationToken);
                    return Result<string>.Of(token);
                },
                cancellationToken);

    /// <summary>The tokens, newest first.</summary>
    public Task<Result<IReadOnlyList<ApiToken>>> ListAsync(Actor actor, CancellationToken cancellationToken) =>
        !actor.IsAdministrator ? Task.FromResult(Refusals.Denied<IReadOnlyList<ApiToken>>()) : scope.OutsideAsync(
            async db => Result<IReadOnlyList<ApiToken>>.Of(await db.ApiTokens.AsNoTracking()
                .OrderByDescending(t => t.CreatedAt)
                .Join(db.Units, t => t.UnitId, u => u.Id, (t, u) => new ApiToken(t.Id, u.Code, t.Role, t.Name, t.CreatedAt, t.ExpiresAt, t.RevokedAt, t.LastUsedAt))
                .ToListAsync(cancellationToken)),
            cancellationToken);

    /// <summary>Revokes a token at once.</summary>
    public Task<Result<bool>> RevokeAsync(Actor actor, Guid tokenId, CancellationToken cancellationToken) =>
        !actor.IsAdministrator ? Task.FromResult(Refusals.Denied<bool>()) : scope.OutsideAsync(
            async db =>
            {
                if (await db.ApiTokens.FirstOrDefaultAsync(t => t.Id == tokenId, cancellationToken) is not { } row)
                {
                    return Refusals.NotFound<bool>("token");
                }

                row.RevokedAt ??= clock.GetCurrentInstant();
                AuditTrail.Add(db, AuditTrail.Everywhere, clock.GetCurrentInstant(), actor, "revoke-token", row.Id, "");
                await db.SaveChangesAsync(cancellationToken);
                return Result<bool>.Of(true);
            },
            cancellationToken);

    /// <summary>Who a token stands for.</summary>
    /// <returns>Refused as not found when it is unknown, revoked or expired.</returns>
    public Task<Result<Actor>> AuthenticateAsync(string token, CancellationToken cancellationToken) => scope.OutsideAsync(
        async db =>
        {
            var (hash, now) = (HashOf(token), clock.GetCurrentInstant());
            var row = await db.ApiTokens.FirstOrDefaultAsync(t => t.Hash == hash, cancellationToken);
            if (row is null || row.RevokedAt is not null || row.ExpiresAt <= now)
            {
                return Refusals.NotFound<Actor>("token");
            }

            if (!(now - row.LastUsedAt < UseNoticedEvery))
            {
                row.LastUsedAt = now;
                await db.SaveChangesAsync(cancellationToken);
            }

            return Result<Actor>.Of(new Actor(row.Id, row.Name, false, new Dictionary<Guid, UnitRole> { [row.UnitId] = row.Role }));
        },
        cancellationToken);

    internal static byte[] HashOf(string secret) => SHA256.HashData(Encoding.UTF8.GetBytes(secret));
}
