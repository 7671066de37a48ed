using NodaTime;

namespace UnitVent.Charting.Rules;

/// <summary>What a rule saw, with its numbers. A finding states; it never tells anyone what to do.</summary>
/// <param name="Rule">The rule's id, for example <c>R24</c>.</param>
/// <param name="Family">Its family.</param>
/// <param name="Severity">How much attention it asks for.</param>
/// <param name="Says">What was seen, numbers first.</param>
/// <param name="LookAt">What may be looked at.</param>
/// <param name="SeenAt">When the youngest entry behind it was so; the finding's age counts from here.</param>
/// <param name="Evidence">The numbers behind it, by name.</param>
/// <param name="Entries">The entries behind it.</param>
public sealed record Finding(
    string Rule,
    Family Family,
    Severity Severity,
    string Says,
    string LookAt,
    Instant SeenAt,
    IReadOnlyDictionary<string, double> Evidence,
    IReadOnlyList<Guid> Entries)
{
    /// <summary>Gets how bad it is on the rule's own scale: larger is worse. Tells a new worse value from the same one.</summary>
    public double Badness { get; init; }

    /// <summary>Gets whether it is an item overdue by its second limit.</summary>
    public bool Overdue { get; init; }
}
