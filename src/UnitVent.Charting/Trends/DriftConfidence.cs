namespace UnitVent.Charting.Trends;

/// <summary>How much data a verdict rests on, in a word [common practice].</summary>
public enum DriftConfidence
{
    /// <summary>Four or five points.</summary>
    Early,

    /// <summary>Six to eight points.</summary>
    Moderate,

    /// <summary>Nine points or more.</summary>
    Firm,
}
