namespace UnitVent.Charting.Entries;

/// <summary>Which bicarbonate the slip prints.</summary>
public enum BicarbonateKind
{
    /// <summary>Actual bicarbonate.</summary>
    Actual,

    /// <summary>Standard bicarbonate.</summary>
    Standard,

    /// <summary>The slip does not say.</summary>
    NotStated,
}
