namespace UnitVent.Charting.Trends;

/// <summary>Which way a quantity moves.</summary>
public enum DriftDirection
{
    /// <summary>No way that stands out from chance.</summary>
    Level,

    /// <summary>It rises.</summary>
    Up,

    /// <summary>It falls.</summary>
    Down,
}
