namespace UnitVent.Charting.Entries;

/// <summary>How strong the cough is.</summary>
public enum Cough
{
    /// <summary>None.</summary>
    None,

    /// <summary>Weak.</summary>
    Weak,

    /// <summary>Strong.</summary>
    Strong,
}
