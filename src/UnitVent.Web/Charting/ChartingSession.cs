using System.Globalization;
using System.Text.RegularExpressions;
using NodaTime;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Results;

namespace UnitVent.Web.Charting;

/// <summary>One opened drawer: its forms, what was typed, and how far saving is. It keeps everything until somebody closes it.</summary>
public sealed partial class ChartingSession
{
    private Instant? firstAttempt;

    public ChartingSession(PatientPicture picture, ChartingTask task)
        : this(picture, task, [.. task.Kinds.Select(k => FormOpening.Empty(k, picture))])
    {
    }

    private ChartingSession(PatientPicture picture, ChartingTask task, IReadOnlyList<EntryForm> forms) => (Picture, Task, Forms) = (picture, task, forms);

    /// <summary>Opens an entry of the chart for correction.</summary>
    public static ChartingSession Correcting(PatientPicture picture, ChartEntry entry) => new(
        picture,
        new($"Correct: {Words.Within(entry.Kind)}", [entry.Kind]),
        [FormOpening.Correction(entry, picture.Window.Unit.Zone)]);

    /// <summary>Gets the picture at the moment of opening: last values and comparisons rest on it.</summary>
    public PatientPicture Picture { get; }

    public ChartingTask Task { get; }

    /// <summary>Gets the instant that stands for now in this form: from the first attempt to save on, that of the attempt, so that a retry is the same entry.</summary>
    public Instant Now(Instant clock) => firstAttempt ?? clock;

    public IReadOnlyList<EntryForm> Forms { get; }

    public SaveState State { get; private set; } = SaveState.Typing;

    /// <summary>Gets or sets whether the settings in force were seen unchanged in a pass; null while nobody looked.</summary>
    public bool? SettingsUnchanged { get; set; }

    /// <summary>Gets the refusals that belong to no field.</summary>
    public IReadOnlyList<FieldError> General { get; private set; } = [];

    public DateTimeZone Zone => Picture.Window.Unit.Zone;

    /// <summary>Everything that speaks against saving, with its form, questions left out.</summary>
    public IEnumerable<(EntryForm Form, FormField Field, FieldError Error)> Problems =>
        from form in Forms from typed in form.Fields from error in typed.Errors select (form, typed, error);

    public IEnumerable<(EntryForm Form, Question Question)> Questions => from form in Forms from question in form.Questions select (form, question);

    /// <summary>The forms that are sent: all but the parts of a pass in which nothing was typed.</summary>
    public IEnumerable<EntryForm> Sent => Task.IsPass ? Forms.Where(IsPartOfPass) : Forms;

    /// <summary>The entries of what was typed so far, as far as they can be read.</summary>
    public IEnumerable<NewEntry> Readable(Instant now) => Sent.Select(f => f.Read(TimeOf(f, now), Zone)).Where(r => r.Succeeded).Select(r => r.Value);

    /// <summary>The entries to record, or null when something cannot be read; the forms then show what.</summary>
    public IReadOnlyList<NewEntry>? Begin(Instant now)
    {
        if (Task.IsPass)
        {
            Forms[0]["settingsConfirmed"].Text = SettingsUnchanged == true ? "true" : "";
        }

        var read = Sent.Select(f => (Form: f, Result: f.Read(TimeOf(f, Now(now)), Zone))).ToList();
        General = read.Count == 0 ? [new("", "empty", "Nothing was typed yet.")] : [];
        read.ForEach(r => r.Form.Show(r.Result.Errors));
        State = read.Count > 0 && read.All(r => r.Result.Succeeded) ? SaveState.Saving : SaveState.Refused;
        if (State != SaveState.Saving)
        {
            return null;
        }

        firstAttempt ??= now;
        return [.. read.Select(r => r.Result.Value)];
    }

    /// <summary>Takes the store's refusal. When the store did not answer, the entry may be in the chart all the same: its time and id stay for the next attempt.</summary>
    public void Refuse(Refusal refusal, IReadOnlyList<FieldError> errors)
    {
        if (refusal == Refusal.Unavailable)
        {
            State = SaveState.NotSaved;
            return;
        }

        (State, firstAttempt) = (SaveState.Refused, null);
        var sent = Sent.ToList();
        var placed = errors.Select(e => Place(e, sent.Count)).ToList();
        for (var i = 0; i < sent.Count; i++)
        {
            sent[i].Show([.. placed.Where(e => e.Entry == i).Select(e => e.Error)]);
        }

        General = [.. placed.Where(e => !e.Error.IsAsk && !HasField(sent, e)).Select(e => e.Error)];
    }

    /// <summary>The errors of several entries name theirs in front of the field: <c>entries[1].pCO2</c>.</summary>
    private static (int Entry, FieldError Error) Place(FieldError error, int count) =>
        EntryPrefix().Match(error.Field) is { Success: true } match
            ? (int.Parse(match.Groups[1].Value, CultureInfo.InvariantCulture), error with { Field = error.Field[match.Length..] })
            : (count == 1 ? 0 : -1, error);

    public void Saved() => State = SaveState.Saved;

    private static bool HasField(List<EntryForm> sent, (int Entry, FieldError Error) e) =>
        e.Entry >= 0 && e.Entry < sent.Count && sent[e.Entry].Fields.Any(f => f.Field.Name == e.Error.Field);

    private bool IsPartOfPass(EntryForm form) => form.Kind switch
    {
        EntryKind.SettingChange => SettingsUnchanged == false || (Picture.Settings is null && form.Touched),
        EntryKind.VentilatorCheck => form.Touched || SettingsUnchanged == true,
        _ => form.Touched,
    };

    /// <summary>A pass has one time, that of its first form; forms whose own time was typed keep it.</summary>
    private Instant TimeOf(EntryForm form, Instant now) =>
        Forms[0] == form || Forms[0].TimeField is not { } shared ? now : shared.Time(now, Zone)?.At ?? now;

    [GeneratedRegex(@"^entries\[(\d+)\]\.", RegexOptions.CultureInvariant)]
    private static partial Regex EntryPrefix();
}
