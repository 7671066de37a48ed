namespace UnitVent.Charting.Entries;

/// <summary>How much is suctioned.</summary>
public enum Secretions
{
    /// <summary>None.</summary>
    None,

    /// <summary>Few.</summary>
    Few,

    /// <summary>Many.</summary>
    Many,
}
