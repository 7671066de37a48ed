namespace UnitVent.Charting.Fields;

/// <summary>A number with its two kinds of limit. The limits are common practice unless the member says otherwise.</summary>
/// <param name="label">The trade's word for it, without unit.</param>
/// <param name="low">The lowest value that can be; below it the entry is refused.</param>
/// <param name="high">The highest value that can be; above it the entry is refused.</param>
[AttributeUsage(AttributeTargets.Property)]
public sealed class NumberAttribute(string label, double low, double high) : FieldAttribute(label)
{
    /// <summary>Gets the lowest value that can be.</summary>
    public double Low { get; } = low;

    /// <summary>Gets the highest value that can be.</summary>
    public double High { get; } = high;

    /// <summary>Gets or sets the value below which a person is asked; NaN for never.</summary>
    public double AskBelow { get; set; } = double.NaN;

    /// <summary>Gets or sets the value above which a person is asked; NaN for never.</summary>
    public double AskAbove { get; set; } = double.NaN;

    /// <summary>Gets or sets the unit as it is shown.</summary>
    public string Unit { get; set; } = "";

    /// <summary>Gets or sets how many decimals are shown.</summary>
    public int Decimals { get; set; }

    /// <summary>Gets or sets whether the value is typed in the unit that the entry's <c>tensionUnit</c> names. The limits are in mmHg.</summary>
    public bool IsTension { get; set; }
}
