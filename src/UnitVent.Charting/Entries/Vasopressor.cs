namespace UnitVent.Charting.Entries;

/// <summary>Whether the circulation is supported, and which way it goes.</summary>
public enum Vasopressor
{
    /// <summary>None.</summary>
    None,

    /// <summary>Unchanged.</summary>
    Stable,

    /// <summary>Rising.</summary>
    Rising,
}
