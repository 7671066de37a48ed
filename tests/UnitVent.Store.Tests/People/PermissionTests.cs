using UnitVent.Store.People;

namespace UnitVent.Store.Tests.People;

public sealed class PermissionTests
{
    private static readonly Operation[] Nurse = [Operation.Read, Operation.Print, Operation.Chart, Operation.Admit, Operation.SetPhase];
    private static readonly Operation[] Therapist = [.. Nurse, Operation.Acknowledge, Operation.SetMethod];
    private static readonly Operation[] Charge = [.. Therapist, Operation.StrikeOthers, Operation.SetContext, Operation.SetThresholds, Operation.ManageBeds];
    private static readonly Operation[] Physician = [.. Therapist, Operation.StrikeOthers, Operation.SetContext, Operation.SetThresholds, Operation.SetTargets];

    public static TheoryData<UnitRole, Operation[]> Allowed => new()
    {
        { UnitRole.Viewer, [Operation.Read, Operation.Print] },
        { UnitRole.Nurse, Nurse },
        { UnitRole.Therapist, Therapist },
        { UnitRole.ChargeTherapist, Charge },
        { UnitRole.Physician, Physician },
    };

    [Theory, MemberData(nameof(Allowed))]
    public void Role_MayDoWhatIsListed_AndNothingElse(UnitRole role, Operation[] allowed) =>
        Assert.Equal(allowed.Order(), Enum.GetValues<Operation>().Where(o => Permissions.Allows(role, o)));

    [Fact]
    public void Unknown_IsDenied()
    {
        Assert.False(Permissions.Allows(UnitRole.Physician, (Operation)99));
        Assert.False(new Actor(null, "nobody", true, new Dictionary<Guid, UnitRole>()).May(Operation.Read, Guid.NewGuid()), "an administrator reads by membership");
    }
}
