namespace UnitVent.Simulation;

/// <summary>The roles in which the invented staff charts.</summary>
public enum UnitRoleName
{
    Nurse,
    Therapist,
    ChargeTherapist,
    Physician,
}
