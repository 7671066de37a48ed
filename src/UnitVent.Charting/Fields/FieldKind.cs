namespace UnitVent.Charting.Fields;

/// <summary>What kind of value a field takes.</summary>
public enum FieldKind
{
    /// <summary>A decimal number.</summary>
    Number,

    /// <summary>A whole number.</summary>
    Whole,

    /// <summary>Yes or no.</summary>
    YesNo,

    /// <summary>Text.</summary>
    Text,

    /// <summary>An instant.</summary>
    Time,

    /// <summary>A calendar date.</summary>
    Date,

    /// <summary>One of a list.</summary>
    Choice,
}
