namespace UnitVent.Charting.Entries;

/// <summary>Which airway the patient has.</summary>
public enum AirwayKind
{
    /// <summary>Oral tube.</summary>
    Oral,

    /// <summary>Nasal tube.</summary>
    Nasal,

    /// <summary>Tracheostomy.</summary>
    Tracheostomy,
}
