using System.Text.Json.Nodes;
using NodaTime;
using UnitVent.Charting.Fields;
using UnitVent.Charting.Results;

namespace UnitVent.Web.Charting;

/// <summary>One field of a form: what it takes, what was typed so far, and what speaks against it.</summary>
public sealed class FormField(EntryField field)
{
    private static readonly HashSet<string> ToCome = ["until", "dueAt", "expiresAt"];

    private (string Text, JsonNode Json)? kept;

    public EntryField Field { get; } = field;

    /// <summary>Gets or sets what was typed, exactly; a choice by its name, yes and no as <c>true</c> and <c>false</c>.</summary>
    public string Text { get; set; } = "";

    /// <summary>Gets or sets the last value, shown beside the field; null when there is none.</summary>
    public LastValue? Last { get; set; }

    /// <summary>Gets or sets whether an optional setting that was in force is no longer set.</summary>
    public bool NoLongerSet { get; set; }

    /// <summary>Gets or sets whether a fraction is typed as a percentage.</summary>
    public bool InPercent { get; set; }

    /// <summary>Gets or sets whether the second pass of a repeated hour is meant; null until somebody chose.</summary>
    public bool? SecondPass { get; set; }

    /// <summary>Gets what speaks against it since the last attempt to save.</summary>
    public List<FieldError> Errors { get; } = [];

    public bool IsFraction => Field.Name == "fiO2";

    public bool IsTimeToCome => Field.Kind == FieldKind.Time && ToCome.Contains(Field.Name);

    public bool IsEmpty => string.IsNullOrWhiteSpace(Text);

    /// <summary>Whether the last value is what will be saved, because nothing was typed.</summary>
    public bool Carries => IsEmpty && !NoLongerSet && Last is { Carried: true };

    /// <summary>Fills in a value of an entry that is being corrected. As long as its text stays, the value stays to the last digit and second.</summary>
    public void Keep(string text, JsonNode json) => (Text, kept) = (text, (text, json));

    /// <summary>The time that was typed; null without one.</summary>
    public TypedTime? Time(Instant now, DateTimeZone zone) => Field.Kind != FieldKind.Time || IsEmpty ? null
        : IsTimeToCome ? TypedTime.ToCome(Text, now, zone, SecondPass == true)
        : TypedTime.Past(Text, now, zone, SecondPass == true);

    /// <summary>What goes into the entry, or what is wrong with what was typed; neither when nothing was.</summary>
    public (JsonNode? Value, string? Problem) Read(Instant now, DateTimeZone zone)
    {
        if (IsEmpty)
        {
            return (Carries ? Last!.Json?.DeepClone() : null, null);
        }

        if (kept is { } unchanged && unchanged.Text == Text && !InPercent)
        {
            return (unchanged.Json.DeepClone(), null);
        }

        return Field.Kind switch
        {
            FieldKind.Number or FieldKind.Whole => Number(),
            FieldKind.YesNo => (JsonValue.Create(Text == "true"), null),
            FieldKind.Time => Instant(Time(now, zone)!),
            FieldKind.Text or FieldKind.Choice or FieldKind.Date => (JsonValue.Create(Text.Trim()), null),
        };
    }

    private (JsonNode?, string?) Number()
    {
        var (value, problem) = TypedNumber.Read(Text);
        return (value is { } number ? JsonValue.Create(InPercent ? number / 100 : number) : null, problem);
    }

    private (JsonNode?, string?) Instant(TypedTime time) =>
        time.Choices.Count > 0 && SecondPass is null ? (null, "The clocks went back that night and this hour came twice. Choose which one.")
        : time.At is { } at ? (JsonValue.Create(at.ToString()), null)
        : (null, time.Problem);
}
