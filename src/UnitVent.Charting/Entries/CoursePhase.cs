namespace UnitVent.Charting.Entries;

/// <summary>Where the patient stands in the course of ventilation.</summary>
public enum CoursePhase
{
    /// <summary>The first hours in the mode.</summary>
    Starting,

    /// <summary>Settled.</summary>
    Maintaining,

    /// <summary>On the way off, chosen by a person.</summary>
    Weaning,

    /// <summary>Support is being raised.</summary>
    SteppingUp,
}
