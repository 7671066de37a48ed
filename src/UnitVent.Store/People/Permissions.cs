using UnitVent.Charting.Entries;

namespace UnitVent.Store.People;

/// <summary>Which role may do what in a unit. What is not said here is refused.</summary>
public static class Permissions
{
    /// <summary>Whether a role allows an operation.</summary>
    public static bool Allows(UnitRole role, Operation operation) => operation switch
    {
        Operation.Read or Operation.Print => true,
        Operation.Chart or Operation.Admit or Operation.SetPhase => role >= UnitRole.Nurse,
        Operation.Acknowledge or Operation.SetMethod => role >= UnitRole.Therapist,
        Operation.StrikeOthers or Operation.SetContext or Operation.SetThresholds => role >= UnitRole.ChargeTherapist,
        Operation.ManageBeds => role == UnitRole.ChargeTherapist,
        Operation.SetTargets => role == UnitRole.Physician,
        _ => false,
    };

    /// <summary>What recording a kind of entry takes.</summary>
    public static Operation ToRecord(EntryKind kind) => kind switch
    {
        EntryKind.Context => Operation.SetContext,
        EntryKind.Target => Operation.SetTargets,
        EntryKind.Phase => Operation.SetPhase,
        EntryKind.Method => Operation.SetMethod,
        _ => Operation.Chart,
    };
}
