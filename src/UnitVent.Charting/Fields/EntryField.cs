using System.Reflection;
using System.Text.Json;
using System.Text.Json.Serialization;
using NodaTime;

namespace UnitVent.Charting.Fields;

/// <summary>One member that a person types: its name, its words, its kind and its limits. Read from the attributes of the entry types.</summary>
public sealed class EntryField
{
    internal EntryField(PropertyInfo property, FieldAttribute attribute)
    {
        Property = property;
        Label = attribute.Label;
        Required = attribute.Required;
        MaxLength = attribute.MaxLength;
        Number = attribute as NumberAttribute;
        Name = property.GetCustomAttribute<JsonPropertyNameAttribute>()?.Name ?? JsonNamingPolicy.CamelCase.ConvertName(property.Name);
        var type = Nullable.GetUnderlyingType(property.PropertyType) ?? property.PropertyType;
        Kind = KindOf(type);
        ChoiceType = type.IsEnum ? type : null;
        Choices = Kind == FieldKind.Choice ? [.. Enum.GetNames(type).Select(JsonNamingPolicy.CamelCase.ConvertName)] : [];
    }

    /// <summary>Gets the member's name as the HTTP interface spells it.</summary>
    public string Name { get; }

    /// <summary>Gets the trade's word for it, without unit.</summary>
    public string Label { get; }

    /// <summary>Gets whether an entry without it is refused.</summary>
    public bool Required { get; }

    /// <summary>Gets the longest text taken, in characters.</summary>
    public int MaxLength { get; }

    /// <summary>Gets what kind of value it takes.</summary>
    public FieldKind Kind { get; }

    /// <summary>Gets the limits of a number; null for everything else.</summary>
    public NumberAttribute? Number { get; }

    /// <summary>Gets the choices as the HTTP interface spells them; empty unless it is a choice.</summary>
    public IReadOnlyList<string> Choices { get; }

    /// <summary>Gets the name of the member that holds it.</summary>
    public string PropertyName => Property.Name;

    /// <summary>Gets the type of its choices; null unless it is a choice.</summary>
    public Type? ChoiceType { get; }

    private PropertyInfo Property { get; }

    /// <summary>The value that an entry carries in this member; null when it was not recorded.</summary>
    public object? ValueIn(object entry) => Property.GetValue(entry);

    private static FieldKind KindOf(Type type) => type switch
    {
        _ when type == typeof(decimal) => FieldKind.Number,
        _ when type == typeof(int) => FieldKind.Whole,
        _ when type == typeof(bool) => FieldKind.YesNo,
        _ when type == typeof(string) => FieldKind.Text,
        _ when type == typeof(Instant) => FieldKind.Time,
        _ when type == typeof(LocalDate) => FieldKind.Date,
        _ when type.IsEnum => FieldKind.Choice,
        _ => throw new NotSupportedException($"{type.Name} is not a kind of field."),
    };
}
