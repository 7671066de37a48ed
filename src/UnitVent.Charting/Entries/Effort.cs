namespace UnitVent.Charting.Entries;

/// <summary>How hard the patient works to breathe.</summary>
public enum Effort
{
    /// <summary>No effort.</summary>
    None,

    /// <summary>Easy.</summary>
    Easy,

    /// <summary>Moderate.</summary>
    Moderate,

    /// <summary>Strong.</summary>
    Strong,
}
