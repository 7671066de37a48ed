using Microsoft.AspNetCore.Components;
using NodaTime;
using UnitVent.Store.Live;
using UnitVent.Store.People;
using UnitVent.Store.Reading;
using UnitVent.Web.Charting;
using UnitVent.Web.Shared;

namespace UnitVent.Web.Board;

/// <summary>One unit, every ventilated patient, the reason to look first. Follows the chart by itself.</summary>
public sealed partial class BoardPage
{
    private static readonly TimeSpan AgesCount = TimeSpan.FromSeconds(30);

    private readonly CancellationTokenSource left = new();
    private readonly CancellationToken leaving;
    private UnitBoard? board;
    private BoardView view = new([], BoardFilter.All[0], false, []);
    private Actor? actor;
    private Instant now;
    private Instant? lostSince;
    private string? refused;
    private string moved = "";
    private Guid? opened;
    private bool admitting;
    private ChartingSession? session;
    private IDisposable? subscription;

    public BoardPage() => leaving = left.Token;

    [Parameter]
    public string? Code { get; set; }

    [SupplyParameterFromQuery(Name = "show")]
    public string? Show { get; set; }

    [SupplyParameterFromQuery(Name = "order")]
    public string? Order { get; set; }

    [Inject]
    private UnitInView Place { get; set; } = default!;

    [Inject]
    private UnitBoards Boards { get; set; } = default!;

    [Inject]
    private ChangeFeed Feed { get; set; } = default!;

    [Inject]
    private CurrentActor Me { get; set; } = default!;

    [Inject]
    private IClock Clock { get; set; } = default!;

    [Inject]
    private NavigationManager Navigation { get; set; } = default!;

    protected override void OnInitialized() => _ = CountAgesAsync();

    protected override async Task OnParametersSetAsync()
    {
        if (Code is { } code)
        {
            Place.Use(code);
        }

        var wanted = Code ?? Place.Unit?.Code;
        if (wanted is not null && wanted != board?.Unit.Code)
        {
            (board, opened) = (null, null);
            await LoadAsync();
        }

        Draw();
    }

    private async Task LoadAsync()
    {
        if ((Code ?? Place.Unit?.Code) is not { } code)
        {
            return;
        }

        var me = await Me.GetAsync(leaving);
        var loaded = await Boards.GetAsync(me, code, leaving);
        if (loaded.Succeeded)
        {
            (board, actor, refused) = (loaded.Value, me, null);
            Listen(loaded.Value.Unit.Id);
        }
        else if (board is null)
        {
            refused = string.Join(" ", loaded.Errors.Select(e => e.Message));
        }

        now = Clock.GetCurrentInstant();
        lostSince = Feed.Connected && loaded.Succeeded ? null : lostSince ?? (board is null ? null : now);
        Draw();
    }

    private void Listen(Guid unitId)
    {
        subscription?.Dispose();
        subscription = Feed.Subscribe(unitId, () => InvokeAsync(async () =>
        {
            await LoadAsync();
            StateHasChanged();
        }));
    }

    /// <summary>Ages grow, and what time alone changes comes true, without anybody charting.</summary>
    private async Task CountAgesAsync()
    {
        using var timer = new PeriodicTimer(AgesCount);
        try
        {
            while (await timer.WaitForNextTickAsync(leaving))
            {
                await InvokeAsync(async () =>
                {
                    await LoadAsync();
                    StateHasChanged();
                });
            }
        }
        catch (OperationCanceledException)
        {
            // The page was left.
        }
    }

    private async Task FindUnitsAsync()
    {
        await Place.LoadAsync(Code, leaving);
        await LoadAsync();
    }

    private void Draw()
    {
        now = Clock.GetCurrentInstant();
        if (board is null)
        {
            return;
        }

        var before = view;
        view = new([.. board.Rows.Select(r => new PatientRow(r.Picture, r.Standing, now))], BoardFilter.Named(Show), Order == "bed", board.Unit.Beds);
        moved = BandMoves.Between(before.All, view.All);
    }

    private void Toggle(PatientRow row) => opened = opened == row.EpisodeId ? null : row.EpisodeId;

    private void Chart(PatientRow row, ChartingTask task) => session = new ChartingSession(row.Picture, task);

    private void OnAdmitted(Guid episode) => Navigation.NavigateTo($"/episodes/{episode}");

    private string Address(string show, bool walking)
    {
        string?[] parts = [show.Length > 0 ? "show=" + show : null, walking ? "order=bed" : null];
        var query = string.Join('&', parts.OfType<string>());
        return $"/units/{board!.Unit.Code}" + (query.Length > 0 ? "?" + query : "");
    }

    public void Dispose()
    {
        left.Cancel();
        left.Dispose();
        subscription?.Dispose();
    }
}
