namespace UnitVent.Physiology;

/// <summary>Where a change of APRV settings leads in the one-compartment model.</summary>
/// <param name="TimeConstant">Time constant of the present releases, taken to stay.</param>
/// <param name="Compliance">Effective compliance of the present releases, taken to stay.</param>
/// <param name="Present">The state before the change.</param>
/// <param name="Planned">The state after it.</param>
/// <param name="PaCO2">The carbon dioxide tension once a new balance is reached.</param>
public sealed record ProjectedChange(
    BreathTime TimeConstant, Compliance Compliance, ReleaseState Present, ReleaseState Planned, PaCO2Band PaCO2);
