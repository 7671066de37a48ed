using System.Text.Json;
using Microsoft.EntityFrameworkCore;
using NodaTime;
using UnitVent.Charting.Flags;
using UnitVent.Charting.Results;
using UnitVent.Charting.Rules;
using UnitVent.Charting.Windows;
using UnitVent.Store.Auditing;
using UnitVent.Store.Live;
using UnitVent.Store.Model;
using UnitVent.Store.People;
using UnitVent.Store.Reading;
using UnitVent.Store.Schema;

namespace UnitVent.Store.Units;

/// <summary>Keeps a unit's thresholds: every choice with who, when and why; what decides over urgent levels holds once a second person agrees.</summary>
public sealed class ThresholdDesk
{
    private const int MostDays = 14;

    private readonly UnitScope scope;
    private readonly IClock clock;

    internal ThresholdDesk(UnitScope scope, IClock clock) => (this.scope, this.clock) = (scope, clock);

    /// <summary>The thresholds of a unit and their history.</summary>
    public Task<Result<UnitThresholds>> ReadAsync(Actor actor, string unitCode, CancellationToken cancellationToken) =>
        scope.WithUnitAsync(actor, unitCode, Operation.Read, async (db, place) => Result<UnitThresholds>.Of(await LoadAsync(db, place.UnitId, cancellationToken)), cancellationToken);

    /// <summary>Chooses thresholds. They are in force at once, or once a second person agrees when they decide over an urgent level.</summary>
    /// <param name="actor">Who.</param>
    /// <param name="unitCode">The unit.</param>
    /// <param name="id">Made by the caller; the same id again is done once.</param>
    /// <param name="chosen">What is to differ from the defaults, by key.</param>
    /// <param name="reason">Why.</param>
    /// <param name="cancellationToken">Gives up.</param>
    public Task<Result<UnitThresholds>> ChooseAsync(
        Actor actor, string unitCode, Guid id, IReadOnlyDictionary<string, double> chosen, string reason, CancellationToken cancellationToken) =>
        ChangeAsync(actor, unitCode, "thresholds", async (db, unitId, before) =>
        {
            if (before.History.Any(v => v.Id == id))
            {
                return [];
            }

            if (ThresholdCheck.Of(chosen, reason).ToList() is { Count: > 0 } errors)
            {
                return errors;
            }

            var (now, then) = (before.Now, RuleThresholds.With(chosen));
            await db.ThresholdVersions.AddAsync(
                new()
                {
                    UnitId = unitId,
                    Id = id,
                    At = clock.GetCurrentInstant(),
                    By = actor.Name,
                    ById = actor.UserId,
                    Reason = reason.Trim(),
                    Chosen = JsonSerializer.Serialize(Threshold.All.Where(t => t.In(then) != t.Default).ToDictionary(t => t.Key, t => t.In(then))),
                    NeedsSecond = Threshold.All.Any(t => t.Is.Urgent && t.In(now) != t.In(then)),
                },
                cancellationToken);
            return [];
        }, cancellationToken);

    /// <summary>Agrees to what somebody else chose, or does not.</summary>
    public Task<Result<UnitThresholds>> AnswerAsync(Actor actor, string unitCode, Guid versionId, bool agrees, CancellationToken cancellationToken) =>
        ChangeAsync(actor, unitCode, agrees ? "thresholds-agreed" : "thresholds-refused", async (db, unitId, before) =>
        {
            if (before.Waiting is not { } waiting || waiting.Id != versionId)
            {
                return [new("", "thresholds.closed", "These thresholds wait for nobody any more.")];
            }

            if (waiting.ById == actor.UserId)
            {
                return [new("", "thresholds.second", "A second person is needed; whoever chose them cannot agree to them.")];
            }

            await db.ThresholdAnswers.AddAsync(
                new() { UnitId = unitId, VersionId = versionId, At = clock.GetCurrentInstant(), By = actor.Name, ById = actor.UserId, Agrees = agrees }, cancellationToken);
            return [];
        }, cancellationToken);

    /// <summary>What thresholds would have raised over the unit's last days.</summary>
    /// <param name="actor">Who asks.</param>
    /// <param name="unitCode">The unit.</param>
    /// <param name="chosen">What would differ from the defaults, by key.</param>
    /// <param name="days">How many days, 1–14.</param>
    /// <param name="cancellationToken">Gives up.</param>
    public async Task<Result<DryRun>> TryAsync(Actor actor, string unitCode, IReadOnlyDictionary<string, double> chosen, int days, CancellationToken cancellationToken)
    {
        List<FieldError> errors = [.. ThresholdCheck.Of(chosen, "dry run")];
        if (days is < 1 or > MostDays)
        {
            errors.Add(new("days", "limit", $"A dry run goes over 1–{MostDays} days."));
        }

        if (errors.Count > 0)
        {
            return Result<DryRun>.Refused(Refusal.Value, errors);
        }

        var now = clock.GetCurrentInstant();
        var from = now - Duration.FromDays(days);
        var charts = await scope.WithUnitAsync(
            actor,
            unitCode,
            Operation.SetThresholds,
            async (db, place) => Result<IReadOnlyList<ChartWindow>>.Of(await WindowLoader.OfDaysAsync(db, place.UnitId, from, now, cancellationToken)),
            cancellationToken);
        return charts.Succeeded
            ? await Task.Run(() => Result<DryRun>.Of(DryRun.Of(charts.Value, RuleThresholds.With(chosen), from, now)), cancellationToken)
            : charts.As<DryRun>();
    }

    /// <summary>What was in force at an instant, by key; empty while the defaults held.</summary>
    internal static async Task<IReadOnlyDictionary<string, double>> ChosenAsync(UnitVentDbContext db, Guid unitId, Instant at, CancellationToken cancellationToken)
    {
        var chosen = await db.ThresholdVersions.AsNoTracking().TagWith("Thresholds.InForce")
            .Where(v => v.UnitId == unitId)
            .Select(v => new
            {
                v.Chosen,
                From = v.NeedsSecond
                    ? db.ThresholdAnswers.Where(a => a.UnitId == unitId && a.VersionId == v.Id && a.Agrees).OrderBy(a => a.At).Select(a => (Instant?)a.At).FirstOrDefault()
                    : v.At,
            })
            .Where(v => v.From <= at)
            .OrderByDescending(v => v.From)
            .Select(v => v.Chosen)
            .FirstOrDefaultAsync(cancellationToken);
        return Read(chosen);
    }

    private Task<Result<UnitThresholds>> ChangeAsync(
        Actor actor, string unitCode, string what, Func<UnitVentDbContext, Guid, UnitThresholds, Task<IReadOnlyList<FieldError>>> change, CancellationToken cancellationToken) =>
        scope.WithUnitAsync(
            actor,
            unitCode,
            Operation.SetThresholds,
            async (db, place) =>
            {
                await db.Database.ExecuteSqlAsync($"select from unit where id = {place.UnitId} for update", cancellationToken);
                var before = await LoadAsync(db, place.UnitId, cancellationToken);
                if (await change(db, place.UnitId, before) is { Count: > 0 } errors)
                {
                    return Result<UnitThresholds>.Refused(errors[0].Code.StartsWith("thresholds", StringComparison.Ordinal) ? Refusal.Conflict : Refusal.Value, errors);
                }

                AuditTrail.Add(db, place.UnitId, clock.GetCurrentInstant(), actor, what, place.UnitId, "");
                await db.SaveChangesAsync(cancellationToken);
                await LookAgainAsync(db, place.UnitId, cancellationToken);
                await Notices.SendAsync(db, place.UnitId, cancellationToken);
                return Result<UnitThresholds>.Of(await LoadAsync(db, place.UnitId, cancellationToken));
            },
            cancellationToken);

    /// <summary>Every chart of the unit is looked at again by what is in force now.</summary>
    private Task<int> LookAgainAsync(UnitVentDbContext db, Guid unitId, CancellationToken cancellationToken)
    {
        var now = clock.GetCurrentInstant();
        return db.Episodes.Where(e => e.UnitId == unitId && e.EndedAt == null).ExecuteUpdateAsync(e => e.SetProperty(x => x.NextEvaluationAt, now), cancellationToken);
    }

    private static async Task<UnitThresholds> LoadAsync(UnitVentDbContext db, Guid unitId, CancellationToken cancellationToken)
    {
        var rows = await db.ThresholdVersions.AsNoTracking().Where(v => v.UnitId == unitId).OrderByDescending(v => v.At).ToListAsync(cancellationToken);
        var answers = (await db.ThresholdAnswers.AsNoTracking().Where(a => a.UnitId == unitId).ToListAsync(cancellationToken)).ToDictionary(a => a.VersionId);
        List<ThresholdVersion> history = [.. rows.Select(r => Version(r, answers.GetValueOrDefault(r.Id)))];
        var newest = history.Count > 0 ? history[0] : null;
        return new(
            history.Where(v => v.From is not null).MaxBy(v => v.From),
            newest is { NeedsSecond: true, Answer: null } ? newest : null,
            history);
    }

    private static ThresholdVersion Version(ThresholdVersionRow row, ThresholdAnswerRow? answer) => new(
        row.Id, row.At, row.By, row.ById, row.Reason, Read(row.Chosen), row.NeedsSecond, answer is null ? null : new(answer.At, answer.By, answer.Agrees));

    private static Dictionary<string, double> Read(string? chosen) =>
        chosen is null ? new Dictionary<string, double>() : JsonSerializer.Deserialize<Dictionary<string, double>>(chosen)!;
}
