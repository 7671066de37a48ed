namespace UnitVent.Charting.Entries;

/// <summary>How the patient looks.</summary>
public enum Comfort
{
    /// <summary>Comfortable.</summary>
    Comfortable,

    /// <summary>Uneasy.</summary>
    Uneasy,

    /// <summary>Distressed.</summary>
    Distressed,
}
