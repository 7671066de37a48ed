namespace UnitVent.Charting.Pictures;

/// <summary>Where a value comes from.</summary>
public enum ValueKind
{
    /// <summary>Read from a device or a slip.</summary>
    Measured,

    /// <summary>Computed from what was read.</summary>
    Derived,

    /// <summary>Computed with a model of the lung.</summary>
    Estimated,
}
