using Microsoft.AspNetCore.Components;
using Microsoft.JSInterop;
using NodaTime;
using UnitVent.Charting.Timelines;
using UnitVent.Web.Shared;

namespace UnitVent.Web.Bedside;

/// <summary>The lanes of the timeline, drawn by a module, and the same numbers as a table.</summary>
public sealed partial class TimelinePanel : IAsyncDisposable
{
    private ElementReference element;
    private IJSObjectReference? module;
    private Task<IJSObjectReference>? chart;
    private Timeline? drawn;

    [Inject]
    private IJSRuntime Browser { get; set; } = default!;

    /// <summary>Null while it loads.</summary>
    [Parameter]
    public Timeline? Timeline { get; set; }

    [Parameter, EditorRequired]
    public required TimelineRange Range { get; set; }

    [Parameter]
    public EventCallback<TimelineRange> RangeChanged { get; set; }

    [Parameter, EditorRequired]
    public required Instant Now { get; set; }

    [Parameter, EditorRequired]
    public required DateTimeZone Zone { get; set; }

    protected override async Task OnAfterRenderAsync(bool firstRender)
    {
        if (Timeline is not { } timeline || timeline == drawn)
        {
            return;
        }

        drawn = timeline;
        var data = Lanes.Of(timeline, Zone);
        if (chart is null)
        {
            await (chart = CreateAsync(data));
        }
        else
        {
            await (await chart).InvokeVoidAsync("set", data);
        }
    }

    private async Task<IJSObjectReference> CreateAsync(object data)
    {
        module = await Browser.InvokeAsync<IJSObjectReference>("import", "./Bedside/TimelinePanel.razor.js");
        return await module.InvokeAsync<IJSObjectReference>("create", element, data);
    }

    private static IEnumerable<(Instant At, IEnumerable<string> Values)> Rows(Timeline timeline)
    {
        var series = Lanes.Series.Select(n => timeline.Series.FirstOrDefault(s => s.Name == n)?.Points.GroupBy(p => p.At).ToDictionary(g => g.Key, g => g.Last().Value) ?? []).ToList();
        return series.SelectMany(s => s.Keys).Distinct().OrderDescending()
            .Select(at => (at, series.Select(s => s.TryGetValue(at, out var value) && value is { } known ? Format.Number(known, known % 1 == 0 ? 0 : 1) : "")));
    }

    public async ValueTask DisposeAsync()
    {
        try
        {
            if (chart is not null)
            {
                var drawing = await chart;
                await drawing.InvokeVoidAsync("dispose");
                await drawing.DisposeAsync();
            }

            await (module?.DisposeAsync() ?? ValueTask.CompletedTask);
        }
        catch (JSDisconnectedException)
        {
            // The browser is gone, and the chart with it.
        }
    }
}
