using System.Collections.Concurrent;
using System.Reflection;

namespace UnitVent.Charting.Fields;

/// <summary>The fields of each type that a person types, in the order in which they are read at the bedside.</summary>
public static class EntryFields
{
    private static readonly ConcurrentDictionary<Type, IReadOnlyList<EntryField>> Known = new();

    /// <summary>The fields of a type; empty when it has none.</summary>
    public static IReadOnlyList<EntryField> Of(Type type) => Known.GetOrAdd(type, static t =>
        [.. t.GetProperties(BindingFlags.Public | BindingFlags.Instance)
            .Select(p => (Property: p, Attribute: p.GetCustomAttribute<FieldAttribute>()))
            .Where(p => p.Attribute is not null)
            .OrderBy(p => p.Property.MetadataToken)
            .Select(p => new EntryField(p.Property, p.Attribute!))]);

    /// <summary>The fields of a type.</summary>
    public static IReadOnlyList<EntryField> Of<T>() => Of(typeof(T));
}
