namespace UnitVent.Charting.Entries;

/// <summary>Which type holds which kind of entry.</summary>
public static class EntryTypes
{
    /// <summary>The type that holds a kind of entry.</summary>
    public static Type Of(EntryKind kind) => kind switch
    {
        EntryKind.SettingChange => typeof(SettingChange),
        EntryKind.BloodGas => typeof(BloodGas),
        EntryKind.VentilatorCheck => typeof(VentilatorCheck),
        EntryKind.BreathingCheck => typeof(BreathingCheck),
        EntryKind.AirwayCheck => typeof(AirwayCheck),
        EntryKind.Event => typeof(BedsideEvent),
        EntryKind.Context => typeof(ContextChange),
        EntryKind.Target => typeof(TargetSet),
        EntryKind.Phase => typeof(PhaseChoice),
        EntryKind.Method => typeof(MethodChoice),
        EntryKind.Note => typeof(Note),
        EntryKind.FollowUp => typeof(FollowUp),
    };
}
