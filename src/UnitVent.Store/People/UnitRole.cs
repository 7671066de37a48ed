namespace UnitVent.Store.People;

/// <summary>What a person is in a unit.</summary>
public enum UnitRole
{
    /// <summary>Reads and prints.</summary>
    Viewer,

    /// <summary>A nurse.</summary>
    Nurse,

    /// <summary>A respiratory therapist.</summary>
    Therapist,

    /// <summary>The therapist in charge of a shift.</summary>
    ChargeTherapist,

    /// <summary>A physician.</summary>
    Physician,
}
