using System.Globalization;
using Microsoft.AspNetCore.Components;
using NodaTime;
using UnitVent.Charting.Flags;
using UnitVent.Charting.Results;
using UnitVent.Charting.Rules;
using UnitVent.Store.People;
using UnitVent.Store.Units;
using UnitVent.Web.Shared;

namespace UnitVent.Web.Rules;

/// <summary>The rules with the unit's thresholds: who chose which when and why, what others would have raised, and the second person's answer.</summary>
public sealed partial class RulesPage
{
    private const int TrialDays = 7;

    private readonly Dictionary<string, string> typed = [];
    private UnitThresholds? thresholds;
    private Actor actor = CurrentActor.Nobody;
    private IReadOnlyList<FieldError> problems = [];
    private (DryRun InForce, DryRun Tried)? trial;
    private Guid nextId = Guid.CreateVersion7();
    private string unitName = "";
    private string reason = "";
    private string? state;
    private string? done;
    private bool mayChoose;
    private bool busy;

    [Inject]
    public required UnitInView Place { get; init; }

    [Inject]
    public required CurrentActor Current { get; init; }

    [Inject]
    public required ThresholdDesk Desk { get; init; }

    [Inject]
    public required IClock Clock { get; init; }

    protected override async Task OnInitializedAsync()
    {
        if (Place.Unit is not { } unit)
        {
            state = "You belong to no unit.";
            return;
        }

        actor = await Current.GetAsync();
        (unitName, mayChoose) = (unit.Name, actor.May(Operation.SetThresholds, unit.Id));
        Take(await Desk.ReadAsync(actor, unit.Code, default));
    }

    internal static string Number(double value) => value.ToString("0.###", CultureInfo.InvariantCulture);

    private static IEnumerable<(Threshold Threshold, double From, double To)> Differences(RuleThresholds now, RuleThresholds then) =>
        Threshold.All.Select(t => (t, t.In(now), t.In(then))).Where(d => d.Item2 != d.Item3);

    private async Task ChooseAsync()
    {
        if (Read() is { } chosen)
        {
            await DoAsync(() => Desk.ChooseAsync(actor, Place.Unit!.Code, nextId, chosen, reason, default));
        }
    }

    private Task AnswerAsync(Guid version, bool agrees) => DoAsync(() => Desk.AnswerAsync(actor, Place.Unit!.Code, version, agrees, default));

    private async Task TryAsync()
    {
        if (Read() is not { } chosen)
        {
            return;
        }

        (busy, trial, done) = (true, null, null);
        actor = await Current.GetAsync();
        var inForce = await Desk.TryAsync(actor, Place.Unit!.Code, thresholds!.InForce?.Chosen ?? new Dictionary<string, double>(), TrialDays, default);
        var tried = await Desk.TryAsync(actor, Place.Unit!.Code, chosen, TrialDays, default);
        problems = [.. inForce.Errors, .. tried.Errors];
        trial = problems.Count == 0 ? (inForce.Value, tried.Value) : null;
        busy = false;
    }

    private async Task DoAsync(Func<Task<Result<UnitThresholds>>> change)
    {
        (busy, done) = (true, null);
        actor = await Current.GetAsync();
        var changed = await change();
        busy = false;
        Take(changed);
        if (changed.Succeeded)
        {
            (nextId, reason, trial) = (Guid.CreateVersion7(), "", null);
            typed.Clear();
            done = changed.Value.Waiting is null ? "Saved; in force." : "Saved; a second person has to agree before it is in force.";
        }
    }

    private void Take(Result<UnitThresholds> read)
    {
        problems = read.Errors;
        thresholds = read.Succeeded ? read.Value : thresholds;
        state = read.Succeeded ? null : read.Errors[0].Message;
    }

    /// <summary>What was typed over what is in force; null when something typed is not a number.</summary>
    private Dictionary<string, double>? Read()
    {
        var chosen = new Dictionary<string, double>(thresholds!.InForce?.Chosen ?? new Dictionary<string, double>());
        List<FieldError> errors = [];
        foreach (var (key, text) in typed)
        {
            if (double.TryParse(text.Replace(',', '.'), NumberStyles.Float, CultureInfo.InvariantCulture, out var value))
            {
                chosen[key] = value;
            }
            else
            {
                errors.Add(new(key, "shape.number", $"{key}: a number is needed, not {text}."));
            }
        }

        problems = errors;
        return errors.Count == 0 ? chosen : null;
    }

    private string Shown(Instant at) => Format.Time(at, Clock.GetCurrentInstant(), Place.Unit!.Zone);
}
