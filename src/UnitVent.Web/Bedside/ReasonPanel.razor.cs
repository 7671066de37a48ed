using Microsoft.AspNetCore.Components;
using UnitVent.Charting.Results;

namespace UnitVent.Web.Bedside;

/// <summary>Asks once more, and for the reason, before something is done to an entry or an episode.</summary>
public sealed partial class ReasonPanel
{
    private string reason = "";
    private string refused = "";
    private bool busy;

    [Parameter, EditorRequired]
    public required string Title { get; set; }

    /// <summary>The word on the button.</summary>
    [Parameter, EditorRequired]
    public required string Verb { get; set; }

    [Parameter]
    public bool AsksReason { get; set; } = true;

    [Parameter]
    public RenderFragment? ChildContent { get; set; }

    /// <summary>Carries it out; answers what speaks against it, empty when it is done.</summary>
    [Parameter, EditorRequired]
    public required Func<string, Task<IReadOnlyList<FieldError>>> Do { get; set; }

    [Parameter]
    public EventCallback Closed { get; set; }

    private async Task SendAsync()
    {
        if (AsksReason && string.IsNullOrWhiteSpace(reason))
        {
            refused = "A reason is needed.";
            return;
        }

        busy = true;
        var errors = await Do(reason.Trim());
        busy = false;
        refused = string.Join(" ", errors.Select(e => e.Message));
        if (errors.Count == 0)
        {
            await Closed.InvokeAsync();
        }
    }
}
