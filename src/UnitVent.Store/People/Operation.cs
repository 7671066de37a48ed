namespace UnitVent.Store.People;

/// <summary>What a role may or may not do in a unit.</summary>
public enum Operation
{
    /// <summary>Read.</summary>
    Read,

    /// <summary>Print a sheet.</summary>
    Print,

    /// <summary>Chart settings, gases, checks, events, notes and follow-ups; strike out own entries.</summary>
    Chart,

    /// <summary>Strike out or correct what somebody else charted.</summary>
    StrikeOthers,

    /// <summary>Admit, move, end; patient's facts.</summary>
    Admit,

    /// <summary>Take a flag in hand.</summary>
    Acknowledge,

    /// <summary>Set targets.</summary>
    SetTargets,

    /// <summary>Say which circumstances are in force.</summary>
    SetContext,

    /// <summary>Choose the phase.</summary>
    SetPhase,

    /// <summary>Choose the method.</summary>
    SetMethod,

    /// <summary>Choose the thresholds of the rules, and agree to what somebody else chose.</summary>
    SetThresholds,

    /// <summary>Keep the unit's beds.</summary>
    ManageBeds,
}
