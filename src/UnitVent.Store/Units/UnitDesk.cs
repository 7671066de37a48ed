using Microsoft.EntityFrameworkCore;
using NodaTime;
using UnitVent.Charting.Results;
using UnitVent.Store.Auditing;
using UnitVent.Store.Live;
using UnitVent.Store.Model;
using UnitVent.Store.People;
using UnitVent.Store.Reading;
using UnitVent.Store.Schema;

namespace UnitVent.Store.Units;

/// <summary>Keeps units, their beds and their settings.</summary>
public sealed class UnitDesk
{
    private readonly UnitScope scope;
    private readonly IClock clock;

    internal UnitDesk(UnitScope scope, IClock clock) => (this.scope, this.clock) = (scope, clock);

    /// <summary>Makes a unit with its beds.</summary>
    public Task<Result<Guid>> CreateAsync(Actor actor, NewUnit unit, CancellationToken cancellationToken) =>
        !actor.IsAdministrator ? Task.FromResult(Refusals.Denied<Guid>()) : scope.OutsideAsync(
            async db =>
            {
                var added = Add(db, unit, actor, clock.GetCurrentInstant());
                if (!added.Succeeded)
                {
                    return added;
                }

                try
                {
                    await db.SaveChangesAsync(cancellationToken);
                    return added;
                }
                catch (DbUpdateException e) when (UniqueViolation.Is(e))
                {
                    return Result<Guid>.Refused(Refusal.Conflict, "code", "unit.exists", $"There is a unit {unit.Code} already.");
                }
            },
            cancellationToken);

    /// <summary>Every unit, by code.</summary>
    public Task<Result<IReadOnlyList<UnitSummary>>> ListAsync(Actor actor, CancellationToken cancellationToken) =>
        !actor.IsAdministrator ? Task.FromResult(Refusals.Denied<IReadOnlyList<UnitSummary>>()) : UnitScope.GuardedAsync(async () =>
        {
            var rows = await scope.OutsideAsync(async db => Result<List<UnitRow>>.Of(await db.Units.AsNoTracking().OrderBy(u => u.Code).ToListAsync(cancellationToken)), cancellationToken);
            var summaries = new List<UnitSummary>();
            foreach (var row in rows.Succeeded ? rows.Value : [])
            {
                var summary = await scope.WithinAsync(row.Id, (db, _) => SummaryAsync(db, row, cancellationToken), cancellationToken);
                if (!summary.Succeeded)
                {
                    return summary.As<IReadOnlyList<UnitSummary>>();
                }

                summaries.Add(summary.Value);
            }

            return rows.Succeeded ? Result<IReadOnlyList<UnitSummary>>.Of(summaries) : rows.As<IReadOnlyList<UnitSummary>>();
        });

    /// <summary>Changes a unit's settings.</summary>
    public Task<Result<bool>> ChangeSettingsAsync(Actor actor, string unitCode, UnitSettings settings, CancellationToken cancellationToken) =>
        OnUnitAsync(actor, unitCode, true, "unit-settings", (_, unit) =>
        {
            var errors = UnitCheck.Settings(settings).ToList();
            if (errors.Count > 0)
            {
                return Task.FromResult(Result<bool>.Refused(Refusal.Value, errors));
            }

            Take(unit, settings);
            return Task.FromResult(Result<bool>.Of(true));
        }, cancellationToken);

    /// <summary>Adds a bed at the end of the walking order, or brings a retired one back.</summary>
    public Task<Result<bool>> AddBedAsync(Actor actor, string unitCode, string name, CancellationToken cancellationToken) =>
        OnUnitAsync(actor, unitCode, false, "add-bed", async (db, unit) =>
        {
            if (UnitCheck.BedName(name) is { } error)
            {
                return Result<bool>.Refused(Refusal.Value, [error]);
            }

            var beds = await db.Beds.Where(b => b.UnitId == unit.Id).ToListAsync(cancellationToken);
            if (beds.Find(b => b.Name == name.Trim()) is { } known)
            {
                known.Retired = false;
            }
            else
            {
                db.Beds.Add(new BedRow { UnitId = unit.Id, Id = Guid.CreateVersion7(), Name = name.Trim(), Position = beds.Count == 0 ? 1 : beds.Max(b => b.Position) + 1 });
            }

            return Result<bool>.Of(true);
        }, cancellationToken);

    /// <summary>Retires a bed that nobody lies in.</summary>
    public Task<Result<bool>> RetireBedAsync(Actor actor, string unitCode, string name, CancellationToken cancellationToken) =>
        OnUnitAsync(actor, unitCode, false, "retire-bed", async (db, unit) =>
        {
            if (await db.Beds.FirstOrDefaultAsync(b => b.UnitId == unit.Id && b.Name == name, cancellationToken) is not { } bed)
            {
                return Refusals.NotFound<bool>("bed");
            }

            if (await db.BedStays.AnyAsync(s => s.UnitId == unit.Id && s.BedId == bed.Id && s.Until == null, cancellationToken))
            {
                return Refusals.BedTaken<bool>(name);
            }

            bed.Retired = true;
            return Result<bool>.Of(true);
        }, cancellationToken);

    internal static Result<Guid> Add(UnitVentDbContext db, NewUnit unit, Actor actor, Instant now)
    {
        var errors = UnitCheck.Of(unit).ToList();
        if (errors.Count > 0)
        {
            return Result<Guid>.Refused(Refusal.Value, errors);
        }

        var row = new UnitRow { Id = Guid.CreateVersion7(), Code = unit.Code, Name = unit.Name.Trim(), TimeZone = unit.TimeZone, IsDemo = unit.IsDemo, CreatedAt = now };
        Take(row, unit.Settings);
        db.Units.Add(row);
        db.Beds.AddRange(unit.Beds.Select((name, i) => new BedRow { UnitId = row.Id, Id = Guid.CreateVersion7(), Name = name.Trim(), Position = i + 1 }));
        AuditTrail.Add(db, AuditTrail.Everywhere, now, actor, "create-unit", row.Id, unit.Code);
        return Result<Guid>.Of(row.Id);
    }

    private static void Take(UnitRow row, UnitSettings settings) =>
        (row.AltitudeM, row.TensionUnit, row.Method, row.CheckInterval, row.ShiftStarts) =
        (settings.AltitudeM, settings.TensionUnit, settings.Method, settings.CheckInterval, [.. settings.ShiftStarts.Order()]);

    private static async Task<Result<UnitSummary>> SummaryAsync(UnitVentDbContext db, UnitRow row, CancellationToken cancellationToken)
    {
        var beds = await db.Beds.AsNoTracking().Where(b => b.UnitId == row.Id && !b.Retired).OrderBy(b => b.Position).Select(b => b.Name).ToListAsync(cancellationToken);
        var taken = await db.BedStays.Where(s => s.UnitId == row.Id && s.Until == null)
            .Join(db.Beds, s => new { s.UnitId, Id = s.BedId }, b => new { b.UnitId, b.Id }, (s, b) => b.Name)
            .ToListAsync(cancellationToken);
        return Result<UnitSummary>.Of(new(WindowLoader.Profile(row, beds), row.CreatedAt, taken));
    }

    /// <summary>Works on a unit as an administrator; where beds are concerned also as whoever may manage them.</summary>
    private Task<Result<bool>> OnUnitAsync(
        Actor actor, string unitCode, bool onlyAdministrators, string what, Func<UnitVentDbContext, UnitRow, Task<Result<bool>>> work, CancellationToken cancellationToken) =>
        UnitScope.GuardedAsync(async () =>
        {
            var found = await scope.OutsideAsync(
                async db => Result<Guid?>.Of(await db.Units.Where(u => u.Code == unitCode).Select(u => (Guid?)u.Id).FirstOrDefaultAsync(cancellationToken)), cancellationToken);
            if (!found.Succeeded)
            {
                return found.As<bool>();
            }

            if (found.Value is not { } unitId || (!actor.IsAdministrator && !actor.May(Operation.Read, unitId)))
            {
                return Refusals.NotFound<bool>("unit");
            }

            return !actor.IsAdministrator && (onlyAdministrators || !actor.May(Operation.ManageBeds, unitId))
                ? Refusals.Denied<bool>()
                : await ChangeAsync(actor, unitId, what, work, cancellationToken);
        });

    private Task<Result<bool>> ChangeAsync(
        Actor actor, Guid unitId, string what, Func<UnitVentDbContext, UnitRow, Task<Result<bool>>> work, CancellationToken cancellationToken) =>
        scope.WithinAsync(
            unitId,
            async (db, place) =>
            {
                var unit = await db.Units.FirstAsync(u => u.Id == place.UnitId, cancellationToken);
                var result = await work(db, unit);
                if (result.Succeeded)
                {
                    AuditTrail.Add(db, unitId, clock.GetCurrentInstant(), actor, what, unitId, "");
                    await db.SaveChangesAsync(cancellationToken);
                    await Notices.SendAsync(db, unitId, cancellationToken);
                }

                return result;
            },
            cancellationToken);
}
