namespace UnitVent.Charting.Entries;

/// <summary>What happened.</summary>
public enum EventKind
{
    /// <summary>Turned prone.</summary>
    Prone,

    /// <summary>Turned supine.</summary>
    Supine,

    /// <summary>Turned to the side.</summary>
    Side,

    /// <summary>Suctioned.</summary>
    Suction,

    /// <summary>Disconnected.</summary>
    Disconnection,

    /// <summary>Recruitment manoeuvre.</summary>
    Recruitment,

    /// <summary>Bronchoscopy.</summary>
    Bronchoscopy,

    /// <summary>Chest drain in.</summary>
    DrainIn,

    /// <summary>Chest drain out.</summary>
    DrainOut,

    /// <summary>Tube changed.</summary>
    TubeChanged,

    /// <summary>Tube fixed anew.</summary>
    TubeRefixed,

    /// <summary>Tracheostomy.</summary>
    Tracheostomy,

    /// <summary>Left the unit for transport or theatre.</summary>
    TransportOut,

    /// <summary>Back in the unit.</summary>
    TransportBack,

    /// <summary>Off the ventilator.</summary>
    OffVentilatorStart,

    /// <summary>Back on the ventilator.</summary>
    OffVentilatorEnd,

    /// <summary>Breathing trial started.</summary>
    BreathingTrialStart,

    /// <summary>Breathing trial ended.</summary>
    BreathingTrialResult,

    /// <summary>Relaxant started.</summary>
    RelaxantStart,

    /// <summary>Relaxant stopped.</summary>
    RelaxantStop,

    /// <summary>Sedation changed.</summary>
    SedationChanged,

    /// <summary>Nitric oxide on.</summary>
    NitricOxideOn,

    /// <summary>Nitric oxide off.</summary>
    NitricOxideOff,

    /// <summary>ECMO started.</summary>
    EcmoStart,

    /// <summary>ECMO stopped.</summary>
    EcmoStop,

    /// <summary>Another procedure.</summary>
    Procedure,
}
