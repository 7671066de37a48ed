using Microsoft.AspNetCore.Components;
using NodaTime;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Episodes;
using UnitVent.Charting.Results;
using UnitVent.Store.Episodes;
using UnitVent.Web.Charting;
using UnitVent.Web.Shared;

namespace UnitVent.Web.Board;

/// <summary>Admits a patient to a free bed.</summary>
public sealed partial class AdmitPanel
{
    private readonly Guid id = Guid.CreateVersion7();
    private readonly FactsForm form = new();
    private readonly HashSet<Circumstance> flags = [];
    private ModalPanel? panel;
    private Instant now;
    private string bed = "";
    private string secured = "";
    private string reason = "";
    private SettingMethod? method;
    private CoursePhase phase = CoursePhase.Starting;
    private bool busy;
    private string state = "";

    [Parameter, EditorRequired]
    public required UnitProfile Unit { get; set; }

    /// <summary>The beds in which somebody lies.</summary>
    [Parameter, EditorRequired]
    public required IReadOnlyList<string> Taken { get; set; }

    [Parameter]
    public EventCallback Closed { get; set; }

    [Parameter]
    public EventCallback<Guid> Admitted { get; set; }

    [Inject]
    private EpisodeDesk Desk { get; set; } = default!;

    [Inject]
    private CurrentActor Me { get; set; } = default!;

    [Inject]
    private IClock Clock { get; set; } = default!;

    protected override void OnInitialized() => now = Clock.GetCurrentInstant();

    private void Turn(Circumstance flag)
    {
        if (!flags.Remove(flag))
        {
            flags.Add(flag);
        }
    }

    private async Task AdmitAsync()
    {
        var facts = form.Read(now, Unit.Zone);
        var time = string.IsNullOrWhiteSpace(secured) ? null : TypedTime.Past(secured, now, Unit.Zone);
        List<FieldError> errors = [.. facts.Errors];
        errors.AddRange(bed.Length == 0 ? [new("bed", "missing", "A bed is needed.")] : []);
        errors.AddRange(time?.Problem is { } problem ? [new("airwaySecuredAt", "typed", "Airway secured at: " + problem)] : []);
        form.Show(errors);
        if (errors.Count > 0)
        {
            await FocusProblemsAsync();
            return;
        }

        (busy, state) = (true, "Admitting …");
        StateHasChanged();
        await SendAsync(new Admission(id, bed, facts.Value, time?.At ?? now)
        {
            Reason = string.IsNullOrWhiteSpace(reason) ? null : reason.Trim(),
            ContextFlags = [.. flags],
            Method = method,
            Phase = phase,
            Confirmed = form.Confirmed,
        });
    }

    private async Task SendAsync(Admission admission)
    {
        var admitted = await Me.DoAsync(actor => Desk.AdmitAsync(actor, Unit.Code, admission, CancellationToken.None));
        busy = false;
        if (admitted.Succeeded)
        {
            await Admitted.InvokeAsync(admitted.Value.EpisodeId);
            return;
        }

        state = admitted.Refusal == Refusal.Unavailable ? "Not saved – the store does not answer. What you typed is kept; press Admit to try again." : "Not admitted yet.";
        form.Show(admitted.Refusal == Refusal.Unavailable ? [] : admitted.Errors);
        await FocusProblemsAsync();
    }

    private async Task FocusProblemsAsync()
    {
        StateHasChanged();
        await Task.Yield();
        await panel!.FocusAsync("admit-problems");
    }
}
