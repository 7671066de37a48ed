using Microsoft.AspNetCore.Components;
using UnitVent.Charting.Entries;
using UnitVent.Web.Charting;

namespace UnitVent.Web.Board;

/// <summary>The table of the board: two lines a patient, the reason first and the numbers under it.</summary>
public sealed partial class BoardTable
{
    [Parameter, EditorRequired]
    public required BoardView View { get; set; }

    [Parameter]
    public TensionUnit TensionUnit { get; set; }

    [Parameter]
    public Guid? Opened { get; set; }

    [Parameter]
    public EventCallback<PatientRow> Toggled { get; set; }

    /// <summary>What stands under a row when it is open.</summary>
    [Parameter, EditorRequired]
    public required RenderFragment<PatientRow> Details { get; set; }

    private string Tension => Tensions.Name(TensionUnit);
}
