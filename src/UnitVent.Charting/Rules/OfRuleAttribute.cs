namespace UnitVent.Charting.Rules;

/// <summary>Says whose thresholds these are.</summary>
/// <param name="id">The rule's id.</param>
[AttributeUsage(AttributeTargets.Property)]
public sealed class OfRuleAttribute(string id) : Attribute
{
    /// <summary>Gets the rule's id.</summary>
    public string Id { get; } = id;
}
