namespace UnitVent.Charting.Entries;

/// <summary>The kinds of entry in a chart.</summary>
public enum EntryKind
{
    /// <summary>The ventilator's settings, whole.</summary>
    SettingChange,

    /// <summary>A blood gas.</summary>
    BloodGas,

    /// <summary>A reading of the ventilator.</summary>
    VentilatorCheck,

    /// <summary>How the patient breathes.</summary>
    BreathingCheck,

    /// <summary>Tube, cuff, humidifier.</summary>
    AirwayCheck,

    /// <summary>Something that happened, from a list.</summary>
    Event,

    /// <summary>A circumstance that changes how values are read.</summary>
    Context,

    /// <summary>What the team aims at for this patient.</summary>
    Target,

    /// <summary>Where the patient stands in the course of ventilation.</summary>
    Phase,

    /// <summary>How the release is set on this patient.</summary>
    Method,

    /// <summary>A note.</summary>
    Note,

    /// <summary>Something to be done by a time.</summary>
    FollowUp,
}
