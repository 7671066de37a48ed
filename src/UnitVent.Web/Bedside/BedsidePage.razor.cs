using Microsoft.AspNetCore.Components;
using NodaTime;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Flags;
using UnitVent.Charting.Results;
using UnitVent.Charting.Timelines;
using UnitVent.Store.Live;
using UnitVent.Store.People;
using UnitVent.Store.Reading;
using UnitVent.Store.Recording;
using UnitVent.Web.Board;
using UnitVent.Web.Charting;
using UnitVent.Web.Shared;

namespace UnitVent.Web.Bedside;

/// <summary>Everything about one patient: what is now, what is in force, how it went, every entry, every flag.</summary>
public sealed partial class BedsidePage
{
    private const int EntriesAPage = 25;

    private readonly CancellationTokenSource left = new();
    private readonly CancellationToken leaving;
    private PatientChart? chart;
    private PatientRow? row;
    private Actor actor = CurrentActor.Nobody;
    private Timeline? timeline;
    private TimelineRange range = TimelineRange.Day;
    private List<ChartEntry>? entries;
    private string? older;
    private IReadOnlyList<Flag>? flags;
    private ChartingSession? session;
    private ChartEntry? striking;
    private Guid strikeId = Guid.CreateVersion7();
    private IDisposable? subscription;
    private Instant now;
    private Instant? lostSince;
    private string? refused;

    public BedsidePage() => leaving = left.Token;

    [Parameter]
    public Guid Id { get; set; }

    [Inject]
    private ChartReader Charts { get; set; } = default!;

    [Inject]
    private ChartRecorder Recorder { get; set; } = default!;

    [Inject]
    private ChangeFeed Feed { get; set; } = default!;

    [Inject]
    private CurrentActor Me { get; set; } = default!;

    [Inject]
    private IClock Clock { get; set; } = default!;

    private DateTimeZone Zone => chart!.Window.Unit.Zone;

    protected override Task OnParametersSetAsync()
    {
        if (chart?.Window.Episode.Id == Id)
        {
            return Task.CompletedTask;
        }

        (chart, entries, timeline, flags, session) = (null, null, null, null, null);
        return LoadAsync();
    }

    private async Task LoadAsync()
    {
        var me = await Me.GetAsync(leaving);
        var loaded = await Charts.PatientAsync(me, Id, null, leaving);
        now = Clock.GetCurrentInstant();
        lostSince = loaded.Succeeded && Feed.Connected ? null : lostSince ?? (chart is null ? null : now);
        if (!loaded.Succeeded)
        {
            refused = chart is null ? string.Join(" ", loaded.Errors.Select(e => e.Message)) : null;
            return;
        }

        (chart, actor, refused) = (loaded.Value, me, null);
        row = new PatientRow(chart.Picture, chart.Standing, now);
        subscription ??= Feed.Subscribe(chart.Window.Unit.Id, () => InvokeAsync(ReloadAsync));
        StateHasChanged();
        await LoadPanelsAsync();
    }

    private async Task ReloadAsync()
    {
        await LoadAsync();
        StateHasChanged();
    }

    private async Task LoadPanelsAsync()
    {
        var page = await Charts.EntriesAsync(actor, Id, new EntryQuery(Limit: EntriesAPage), leaving);
        (entries, older) = page.Succeeded ? ([.. page.Value.Items], page.Value.Next) : (entries, older);
        var all = await Charts.FlagsAsync(actor, Id, true, leaving);
        flags = all.Succeeded ? all.Value : flags;
        await ShowAsync(range);
    }

    private async Task ShowAsync(TimelineRange wanted)
    {
        range = wanted;
        var loaded = await Charts.TimelineAsync(actor, Id, wanted.From(chart!.Picture), chart.Picture.AsOf, leaving);
        timeline = loaded.Succeeded ? loaded.Value : timeline;
    }

    private async Task OlderAsync()
    {
        var page = await Charts.EntriesAsync(actor, Id, new EntryQuery(After: older, Limit: EntriesAPage), leaving);
        if (page.Succeeded)
        {
            entries!.AddRange(page.Value.Items);
            older = page.Value.Next;
        }
    }

    private async Task<IReadOnlyList<FieldError>> StrikeAsync(ChartEntry entry, string reason)
    {
        var struck = await Me.DoAsync(a => Recorder.StrikeOutAsync(a, Id, entry.Id, strikeId, reason, CancellationToken.None));
        if (struck.Succeeded)
        {
            strikeId = Guid.CreateVersion7();
            await LoadAsync();
        }

        return struck.Errors;
    }

    private async Task FollowUpDoneAsync(Guid followUp)
    {
        await Me.DoAsync(a => Recorder.FollowUpStepAsync(a, followUp, Guid.CreateVersion7(), FollowUpStep.Done, null, null, CancellationToken.None));
        await LoadAsync();
    }

    private async Task ConfirmedAsync(Entry entry)
    {
        await Me.DoAsync(a => Recorder.RecordAsync(a, Id, [new(Guid.CreateVersion7(), entry)], CancellationToken.None));
        await LoadAsync();
    }

    private bool May(Operation operation) => actor.May(operation, chart!.Window.Unit.Id);

    public void Dispose()
    {
        left.Cancel();
        left.Dispose();
        subscription?.Dispose();
    }
}
