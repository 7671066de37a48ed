using Microsoft.AspNetCore.Components;
using NodaTime;
using UnitVent.Charting.Checking;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Episodes;
using UnitVent.Store.Recording;
using UnitVent.Web.Shared;

namespace UnitVent.Web.Charting;

/// <summary>The drawer in which everything is charted. It keeps what was typed until it is closed, whatever the store does.</summary>
public sealed partial class ChartingDrawer
{
    private ModalPanel? panel;
    private IReadOnlyList<string> follows = [];
    private IReadOnlyList<string> answer = [];
    private Instant now;
    private Instant savedAt;
    private string? focusNext;

    [Parameter, EditorRequired]
    public required ChartingSession Session { get; set; }

    [Parameter]
    public EventCallback Closed { get; set; }

    /// <summary>Something was recorded.</summary>
    [Parameter]
    public EventCallback Recorded { get; set; }

    [Inject]
    private ChartRecorder Recorder { get; set; } = default!;

    [Inject]
    private CurrentActor Me { get; set; } = default!;

    [Inject]
    private IClock Clock { get; set; } = default!;

    private EpisodeFacts Episode => Session.Picture.Window.Episode;

    private string? Born => Episode.Patient.BirthDate is { } born ? "· born " + Format.DateOf(born) : null;

    protected override void OnParametersSet() => now = Clock.GetCurrentInstant();

    protected override async Task OnAfterRenderAsync(bool firstRender)
    {
        if (focusNext is { } id)
        {
            focusNext = null;
            await panel!.FocusAsync(id);
        }
    }

    private async Task SaveAsync()
    {
        if (Session.State == SaveState.Saving)
        {
            return;
        }

        now = Clock.GetCurrentInstant();
        if (Session.Begin(now) is not { } entries)
        {
            focusNext = "problems";
            return;
        }

        StateHasChanged();
        var result = await Me.DoAsync(actor => Recorder.RecordAsync(actor, Episode.Id, entries, CancellationToken.None));
        if (result.Refusal is { } refusal)
        {
            Session.Refuse(refusal, result.Errors);
            focusNext = Session.Problems.Any() || Session.General.Count > 0 ? "problems" : null;
            return;
        }

        Session.Saved();
        savedAt = Clock.GetCurrentInstant();
        answer = WhatItChanged.Sentences(result.Value.Before, result.Value.After, result.Value.Steps);
        focusNext = "done";
        await Recorded.InvokeAsync();
    }

    private void OnChanged(EntryForm form, FormField typed)
    {
        now = Clock.GetCurrentInstant();
        form.Retyped(typed);
        if (form.Kind == EntryKind.SettingChange && typed.Field.Name == "mode")
        {
            LastValues.Give(form, Session.Picture);
        }

        follows = NumbersThatFollow.Of(Session.Picture, Session.Readable(now), now);
    }

    private Task CloseAsync() => Closed.InvokeAsync();

    private bool AsksForSettings(EntryForm form) => Session.Task.IsPass && form.Kind == EntryKind.SettingChange && Session.Picture.Settings is not null;

    private bool IsShown(EntryForm form) => !AsksForSettings(form) || Session.SettingsUnchanged == false;

    /// <summary>In a pass the time stands once, and what was seen of the settings is asked in their own part.</summary>
    private bool IsHidden(EntryForm form, string name) => Session.Task.IsPass
        && ((form != Session.Forms[0] && form.TimeField?.Field.Name == name) || name == "settingsConfirmed");

    private static bool IsNeeded(EntryForm form, FormField typed) => typed.Field.Name switch
    {
        "pO2" => form["specimen"].Text == "arterial",
        var name when form.Mode is { } mode => typed.Field.Required || SettingCheck.Needs(mode, name),
        _ => typed.Field.Required && typed != form.TimeField,
    };

    private static string TensionOf(EntryForm form) => form.Kind == EntryKind.BloodGas ? form["tensionUnit"].Text : "mmHg";

    private static string IdOf(EntryForm form, FormField typed) => $"f-{form.Kind}-{typed.Field.Name}";

    private string Time(Instant at) => Format.Time(at, now, Session.Zone);
}
