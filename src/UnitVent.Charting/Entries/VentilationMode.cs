namespace UnitVent.Charting.Entries;

/// <summary>How the ventilator breathes for the patient, without trade names.</summary>
public enum VentilationMode
{
    /// <summary>Airway pressure release ventilation.</summary>
    Aprv,

    /// <summary>Volume control.</summary>
    VolumeControl,

    /// <summary>Pressure control.</summary>
    PressureControl,

    /// <summary>Pressure support.</summary>
    PressureSupport,

    /// <summary>Continuous positive airway pressure.</summary>
    Cpap,

    /// <summary>Another mode, named in words.</summary>
    Other,
}
