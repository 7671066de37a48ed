using System.Text.Json.Nodes;
using NodaTime;
using NodaTime.Text;
using UnitVent.Charting.Checking;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Fields;
using UnitVent.Charting.Results;

namespace UnitVent.Web.Charting;

/// <summary>A form for one entry of any kind. Its id is made when it opens, so that a double click or a retry is one entry.</summary>
public sealed class EntryForm
{
    private readonly Dictionary<string, FormField> byName;

    public EntryForm(EntryKind kind, Guid id)
    {
        Kind = kind;
        Id = id;
        Fields = [.. EntryFields.Of(EntryTypes.Of(kind)).Select(f => new FormField(f))];
        byName = Fields.ToDictionary(f => f.Field.Name);
    }

    public EntryKind Kind { get; }

    public Guid Id { get; }

    public IReadOnlyList<FormField> Fields { get; }

    /// <summary>Gets or sets the entry that this one replaces.</summary>
    public Guid? Corrects { get; init; }

    /// <summary>Gets or sets why it replaces another.</summary>
    public string CorrectionReason { get; set; } = "";

    public List<Question> Questions { get; } = [];

    public FormField this[string name] => byName[name];

    /// <summary>The field of the time at which it was so; null for kinds that have none.</summary>
    public FormField? TimeField => Fields.FirstOrDefault(f => f.Field is { Kind: FieldKind.Time, Required: true } && !f.IsTimeToCome);

    /// <summary>The mode chosen in a setting change, or the one in force that it carries on; null in other kinds.</summary>
    public VentilationMode? Mode => Kind != EntryKind.SettingChange ? null : Parsed(byName["mode"]);

    /// <summary>Whether somebody typed anything but a time and a unit.</summary>
    public bool Touched => Fields.Any(f => (!f.IsEmpty || f.NoLongerSet) && f != TimeField && f.Field.Name != "tensionUnit");

    /// <summary>What was typed as an entry, or everything that has the wrong shape.</summary>
    /// <param name="takenAt">The time when none was typed.</param>
    /// <param name="zone">The unit's zone.</param>
    public Result<NewEntry> Read(Instant takenAt, DateTimeZone zone)
    {
        var read = TypedFields.Read(EntryTypes.Of(Kind), Sent(), takenAt, zone, f => f == TimeField ? JsonValue.Create(InstantPattern.ExtendedIso.Format(takenAt)) : null);
        return read.Succeeded ? Result<NewEntry>.Of(Entry((Entry)read.Value)) : read.As<NewEntry>();
    }

    /// <summary>Shows what speaks against it: at the fields, and as questions.</summary>
    public void Show(IReadOnlyList<FieldError> errors)
    {
        foreach (var field in Fields)
        {
            field.Errors.Clear();
            field.Errors.AddRange(errors.Where(e => e.Field == field.Field.Name && !e.IsAsk));
        }

        var answered = Questions.Where(q => q.Yes).Select(q => q.Asked.Code).ToHashSet();
        Questions.RemoveAll(q => !q.Yes);
        Questions.AddRange(errors.Where(e => e.IsAsk && !answered.Contains(e.Code)).Select(e => new Question(e)));
    }

    /// <summary>What was said about a value that a person typed anew holds no longer: neither the error nor the answer to a question.</summary>
    public void Retyped(FormField field)
    {
        field.Errors.Clear();
        Questions.RemoveAll(q => q.Asked.Field == field.Field.Name);
    }

    private NewEntry Entry(Entry body) => new(Id, body)
    {
        Confirmed = [.. Questions.Where(q => q.Yes).Select(q => q.Asked.Code)],
        Corrects = Corrects,
        CorrectionReason = Corrects is null ? null : CorrectionReason.Trim(),
    };

    /// <summary>Only members that the chosen mode has are sent; what was typed for another mode stays in its field.</summary>
    private IEnumerable<FormField> Sent() => Mode is { } mode ? SettingCheck.FieldsOf(mode).Select(n => byName[n]) : Fields;

    private static VentilationMode? Parsed(FormField mode) =>
        Enum.TryParse<VentilationMode>(mode.IsEmpty ? mode.Last is { Carried: true } last ? last.Json?.GetValue<string>() : null : mode.Text, ignoreCase: true, out var chosen) ? chosen : null;
}
