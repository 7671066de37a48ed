using Microsoft.AspNetCore.Components;
using NodaTime;
using UnitVent.Charting.Entries;
using UnitVent.Web.Shared;

namespace UnitVent.Web.Bedside;

/// <summary>Everything charted, newest first, with who and when; struck and replaced entries on request.</summary>
public sealed partial class EntriesPanel
{
    private static readonly Duration LateAfter = Duration.FromMinutes(30);

    private bool withStruck;

    /// <summary>Null while they load.</summary>
    [Parameter]
    public IReadOnlyList<ChartEntry>? Entries { get; set; }

    [Parameter]
    public bool More { get; set; }

    [Parameter]
    public EventCallback Older { get; set; }

    [Parameter, EditorRequired]
    public required Instant Now { get; set; }

    [Parameter, EditorRequired]
    public required DateTimeZone Zone { get; set; }

    [Parameter]
    public bool MayChart { get; set; }

    [Parameter]
    public EventCallback<ChartEntry> Correct { get; set; }

    [Parameter]
    public EventCallback<ChartEntry> Strike { get; set; }

    private static bool IsLate(ChartEntry entry) => entry.RecordedAt - entry.EffectiveAt > LateAfter;

    private string Time(Instant at) => Format.Time(at, Now, Zone);
}
