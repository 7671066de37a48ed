namespace UnitVent.Charting.Fields;

/// <summary>Says what a member that a person types is called on screen and whether it must be there.</summary>
/// <param name="label">The trade's word for it, without unit.</param>
[AttributeUsage(AttributeTargets.Property)]
public class FieldAttribute(string label) : Attribute
{
    /// <summary>Gets the trade's word for it, without unit.</summary>
    public string Label { get; } = label;

    /// <summary>Gets or sets whether an entry without it is refused.</summary>
    public bool Required { get; set; }

    /// <summary>Gets or sets the longest text that is taken, in characters; texts only.</summary>
    public int MaxLength { get; set; } = 200;
}
