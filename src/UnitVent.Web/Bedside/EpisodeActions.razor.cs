using Microsoft.AspNetCore.Components;
using NodaTime;
using UnitVent.Charting.Episodes;
using UnitVent.Charting.Results;
using UnitVent.Store.Episodes;
using UnitVent.Store.People;
using UnitVent.Web.Charting;
using UnitVent.Web.Shared;

namespace UnitVent.Web.Bedside;

/// <summary>Moves, ends, reopens and cancels an episode, and corrects who the patient is.</summary>
public sealed partial class EpisodeActions
{
    private Panel open;
    private Guid id = Guid.CreateVersion7();
    private string bed = "";
    private string endedAt = "";
    private Outcome? outcome;
    private FactsForm? facts;

    private enum Panel
    {
        None,
        Move,
        End,
        Reopen,
        Cancel,
        Facts,
    }

    [Parameter, EditorRequired]
    public required EpisodeFacts Episode { get; set; }

    [Parameter, EditorRequired]
    public required UnitProfile Unit { get; set; }

    [Parameter, EditorRequired]
    public required Instant Now { get; set; }

    [Parameter]
    public EventCallback Changed { get; set; }

    [Inject]
    private EpisodeDesk Desk { get; set; } = default!;

    [Inject]
    private CurrentActor Me { get; set; } = default!;

    private Task<IReadOnlyList<FieldError>> MoveAsync() => bed.Length == 0
        ? Refused("bed", "Choose the bed.")
        : SendAsync(a => Desk.MoveAsync(a, Episode.Id, id, bed, CancellationToken.None));

    private Task<IReadOnlyList<FieldError>> EndAsync()
    {
        var time = string.IsNullOrWhiteSpace(endedAt) ? null : TypedTime.Past(endedAt, Now, Unit.Zone);
        return time?.Problem is { } problem ? Refused("endedAt", problem)
            : outcome is not { } how ? Refused("outcome", "Choose the outcome.")
            : SendAsync(a => Desk.EndAsync(a, Episode.Id, id, time?.At ?? Now, how, CancellationToken.None));
    }

    private Task<IReadOnlyList<FieldError>> CorrectAsync(string reason)
    {
        var read = facts!.Read(Now, Unit.Zone);
        facts.Show(read.Errors);
        return read.Succeeded
            ? SendAsync(a => Desk.CorrectPatientAsync(a, Episode.Id, id, read.Value, reason, CancellationToken.None))
            : Task.FromResult(read.Errors);
    }

    private async Task<IReadOnlyList<FieldError>> SendAsync(Func<Actor, Task<Result<Guid>>> work)
    {
        var done = await Me.DoAsync(work);
        if (done.Succeeded)
        {
            id = Guid.CreateVersion7();
            await Changed.InvokeAsync();
        }

        return done.Errors;
    }

    private void OpenFacts() => (facts, open) = (FactsForm.Of(Episode.Patient), Panel.Facts);

    private void Close() => open = Panel.None;

    private static Task<IReadOnlyList<FieldError>> Refused(string field, string message) =>
        Task.FromResult<IReadOnlyList<FieldError>>([new(field, "missing", message)]);
}
