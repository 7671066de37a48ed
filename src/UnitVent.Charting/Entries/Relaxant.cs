namespace UnitVent.Charting.Entries;

/// <summary>Whether a muscle relaxant acts.</summary>
public enum Relaxant
{
    /// <summary>None.</summary>
    None,

    /// <summary>Given as a bolus.</summary>
    Bolus,

    /// <summary>Running.</summary>
    Infusion,
}
