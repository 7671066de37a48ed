using Microsoft.AspNetCore.Components;
using NodaTime;
using UnitVent.Charting.Fields;

namespace UnitVent.Web.Charting;

/// <summary>Draws one field: label, what is typed, unit, the last value, what is wrong.</summary>
public sealed partial class FieldInput
{
    [Parameter, EditorRequired]
    public required FormField Entry { get; set; }

    /// <summary>Unique in the page.</summary>
    [Parameter, EditorRequired]
    public required string Id { get; set; }

    [Parameter, EditorRequired]
    public required Instant Now { get; set; }

    [Parameter, EditorRequired]
    public required DateTimeZone Zone { get; set; }

    /// <summary>The unit of tensions, as chosen in the form.</summary>
    [Parameter]
    public string TensionUnit { get; set; } = "mmHg";

    /// <summary>Whether the form cannot do without it; depends on the mode.</summary>
    [Parameter]
    public bool Needed { get; set; }

    /// <summary>A value was typed and left, or chosen.</summary>
    [Parameter]
    public EventCallback<FormField> Changed { get; set; }

    private string Unit => Entry.Field.Number switch
    {
        { IsTension: true } => TensionUnit,
        { } number => number.Unit,
        null => "",
    };

    private string Keypad => Entry.Field switch
    {
        { Number.Low: < 0 } or { Kind: FieldKind.Text or FieldKind.Time } => "text",
        { Kind: FieldKind.Number } => "decimal",
        { Kind: FieldKind.Whole } => "numeric",
        _ => "text",
    };

    private string Width => Entry.Field.Kind is FieldKind.Text or FieldKind.Date ? "wide" : Entry.Field.Kind == FieldKind.Time ? "medium" : "narrow";

    private string? Wrong => Entry.Errors.Count > 0 ? "true" : null;

    private string Described => $"{Id}-unit {Id}-hint" + (Entry.Errors.Count > 0 ? $" {Id}-error" : "");

    private Task LeftAsync() => Changed.InvokeAsync(Entry);

    private Task ChosenAsync(ChangeEventArgs choice)
    {
        Entry.Text = (string?)choice.Value ?? "";
        return LeftAsync();
    }

    private Task ClearAsync() => ChosenAsync(new ChangeEventArgs { Value = "" });

    /// <summary>What was typed stays as it is; only what it means is switched.</summary>
    private Task SwitchUnitAsync()
    {
        Entry.InPercent = !Entry.InPercent;
        return LeftAsync();
    }

    private Task PassAsync(bool second)
    {
        Entry.SecondPass = second;
        return LeftAsync();
    }

    private Task SetAsync(bool noLonger)
    {
        Entry.NoLongerSet = noLonger;
        return LeftAsync();
    }
}
