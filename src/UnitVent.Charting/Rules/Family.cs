namespace UnitVent.Charting.Rules;

/// <summary>What findings are grouped by: one card a family.</summary>
public enum Family
{
    /// <summary>How long the release lasts.</summary>
    Timing,

    /// <summary>Resistance of the airway.</summary>
    Airway,

    /// <summary>Loss of lung volume.</summary>
    Collapse,

    /// <summary>Loss of the patient's own breathing.</summary>
    Drive,

    /// <summary>Too much work of breathing.</summary>
    Effort,

    /// <summary>Carbon dioxide and pH.</summary>
    CarbonDioxide,

    /// <summary>Oxygen.</summary>
    Oxygen,

    /// <summary>Volumes and pressures.</summary>
    VolumeAndPressure,

    /// <summary>Circulation.</summary>
    Circulation,

    /// <summary>A sudden change.</summary>
    Sudden,

    /// <summary>Steps down.</summary>
    StepDown,

    /// <summary>Coming off the ventilator.</summary>
    Liberation,

    /// <summary>Entries that do not fit together.</summary>
    Entry,

    /// <summary>What is due or not known.</summary>
    Due,
}
