using Microsoft.AspNetCore.Components;
using Microsoft.JSInterop;

namespace UnitVent.Web.Charting;

/// <summary>The browser's own modal dialogue, in the middle or at the side. Its owner closes it by rendering it no longer.</summary>
public sealed partial class ModalPanel : IAsyncDisposable
{
    private readonly string titleId = "panel-" + Guid.NewGuid().ToString("N")[..8];
    private ElementReference dialogue;
    private IJSObjectReference? module;

    [Inject]
    private IJSRuntime Browser { get; set; } = default!;

    [Parameter, EditorRequired]
    public required string Title { get; set; }

    [Parameter]
    public bool AtSide { get; set; }

    [Parameter, EditorRequired]
    public required RenderFragment ChildContent { get; set; }

    /// <summary>The panel is closed by its owner, who stops rendering it.</summary>
    [Parameter]
    public EventCallback Closed { get; set; }

    protected override async Task OnAfterRenderAsync(bool firstRender)
    {
        if (firstRender)
        {
            module = await Browser.InvokeAsync<IJSObjectReference>("import", "./Charting/ModalPanel.razor.js");
            await module.InvokeVoidAsync("open", dialogue);
        }
    }

    /// <summary>Moves the focus to an element inside the panel.</summary>
    public async Task FocusAsync(string elementId)
    {
        if (module is not null)
        {
            await module.InvokeVoidAsync("focus", elementId);
        }
    }

    private Task CloseAsync() => Closed.InvokeAsync();

    public async ValueTask DisposeAsync()
    {
        try
        {
            if (module is not null)
            {
                await module.InvokeVoidAsync("giveBack");
                await module.DisposeAsync();
            }
        }
        catch (JSDisconnectedException)
        {
            // The browser is gone, and the panel with it.
        }
    }
}
