namespace UnitVent.Charting.Entries;

/// <summary>What became of a follow-up.</summary>
public enum FollowUpStep
{
    /// <summary>Done.</summary>
    Done,

    /// <summary>Cancelled.</summary>
    Cancelled,

    /// <summary>Given to another role.</summary>
    Reassigned,
}
