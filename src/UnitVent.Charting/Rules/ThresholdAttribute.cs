namespace UnitVent.Charting.Rules;

/// <summary>Says what a threshold is called, between which limits a unit may move it, and where its default comes from.</summary>
/// <param name="label">What it is, in words.</param>
/// <param name="low">The lowest value a unit may choose.</param>
/// <param name="high">The highest value a unit may choose.</param>
[AttributeUsage(AttributeTargets.Property)]
public sealed class ThresholdAttribute(string label, double low, double high) : Attribute
{
    /// <summary>Gets what it is, in words.</summary>
    public string Label { get; } = label;

    /// <summary>Gets the lowest value a unit may choose.</summary>
    public double Low { get; } = low;

    /// <summary>Gets the highest value a unit may choose.</summary>
    public double High { get; } = high;

    /// <summary>Gets or sets the unit; empty for a share of one.</summary>
    public string Unit { get; set; } = "";

    /// <summary>Gets or sets where the default comes from.</summary>
    public string Source { get; set; } = "common practice";

    /// <summary>Gets or sets whether it decides over an urgent level, so that two people have to agree.</summary>
    public bool Urgent { get; set; }
}
