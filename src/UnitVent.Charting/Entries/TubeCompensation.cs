namespace UnitVent.Charting.Entries;

/// <summary>Whether the ventilator makes up for the resistance of the tube.</summary>
public enum TubeCompensation
{
    /// <summary>On.</summary>
    On,

    /// <summary>Off.</summary>
    Off,

    /// <summary>This ventilator does not offer it.</summary>
    NotOffered,

    /// <summary>Not looked at.</summary>
    NotSeen,
}
