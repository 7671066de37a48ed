namespace UnitVent.Simulation.Staff;

/// <summary>The invented people who chart; one a role.</summary>
internal static class StaffMember
{
    public static string NameOf(UnitRoleName role) => role switch
    {
        UnitRoleName.Nurse => "Demo Nurse",
        UnitRoleName.Therapist => "Demo Therapist",
        UnitRoleName.ChargeTherapist => "Demo Charge Therapist",
        UnitRoleName.Physician => "Demo Physician",
    };
}
