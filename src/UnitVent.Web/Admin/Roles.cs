using UnitVent.Store.People;

namespace UnitVent.Web.Admin;

/// <summary>Roles in words.</summary>
public static class Roles
{
    public static string Words(UnitRole role) => role switch
    {
        UnitRole.Viewer => "viewer",
        UnitRole.Nurse => "nurse",
        UnitRole.Therapist => "therapist",
        UnitRole.ChargeTherapist => "charge therapist",
        UnitRole.Physician => "physician",
    };
}
