namespace UnitVent.Charting.Flags;

/// <summary>How a flag stands.</summary>
public enum FlagState
{
    /// <summary>Open.</summary>
    Open,

    /// <summary>Cleared by a later value.</summary>
    Cleared,

    /// <summary>Closed because the entry behind it was struck out or corrected.</summary>
    ClosedByCorrection,
}
