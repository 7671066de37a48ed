namespace UnitVent.Charting.Pictures;

/// <summary>How far a computed value can be had.</summary>
public enum ValueState
{
    /// <summary>It stands.</summary>
    Ok,

    /// <summary>An input was never recorded.</summary>
    Missing,

    /// <summary>An input is older than its limit.</summary>
    Stale,

    /// <summary>An input is outside what can be.</summary>
    Range,

    /// <summary>The formula is not defined for these inputs.</summary>
    Domain,

    /// <summary>The formula does not belong to this mode.</summary>
    Mode,

    /// <summary>It stands, but outside the range where the relation was derived.</summary>
    Validity,

    /// <summary>The inputs were taken under different settings.</summary>
    Pair,
}
