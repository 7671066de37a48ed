using System.Reflection;
using System.Text.Json;

namespace UnitVent.Charting.Rules;

/// <summary>One threshold of one rule: what it is called, its limits, its default and where that comes from.</summary>
public sealed class Threshold
{
    private readonly PropertyInfo options;
    private readonly PropertyInfo property;

    private Threshold(PropertyInfo options, PropertyInfo property)
    {
        (this.options, this.property) = (options, property);
        Rule = options.GetCustomAttribute<OfRuleAttribute>()!.Id;
        Is = property.GetCustomAttribute<ThresholdAttribute>() ?? throw new InvalidOperationException($"{property.Name} has no limits.");
        Key = $"{Rule}.{JsonNamingPolicy.CamelCase.ConvertName(property.Name)}";
        Default = In(new());
    }

    /// <summary>Gets every threshold, by rule.</summary>
    public static IReadOnlyList<Threshold> All { get; } =
    [
        .. typeof(RuleThresholds).GetProperties()
            .SelectMany(o => o.PropertyType.GetProperties().Where(p => p.PropertyType == typeof(double)).Select(p => new Threshold(o, p)))
            .OrderBy(t => t.Rule, StringComparer.Ordinal),
    ];

    /// <summary>Gets its name in the store and the interface: rule and threshold.</summary>
    public string Key { get; }

    /// <summary>Gets the rule's id.</summary>
    public string Rule { get; }

    /// <summary>Gets label, limits, unit and source.</summary>
    public ThresholdAttribute Is { get; }

    /// <summary>Gets the default.</summary>
    public double Default { get; }

    /// <summary>The value that a unit's thresholds have.</summary>
    public double In(RuleThresholds thresholds) => (double)property.GetValue(options.GetValue(thresholds))!;

    internal void Put(RuleThresholds into, double value) => property.SetValue(options.GetValue(into), value);
}
