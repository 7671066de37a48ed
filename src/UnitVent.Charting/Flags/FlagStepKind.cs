namespace UnitVent.Charting.Flags;

/// <summary>What happened to a flag.</summary>
public enum FlagStepKind
{
    /// <summary>It was raised.</summary>
    Raised,

    /// <summary>It is still true with newer numbers.</summary>
    StillTrue,

    /// <summary>It got worse; whoever had it in hand has it no longer.</summary>
    Worse,

    /// <summary>It got milder.</summary>
    Milder,

    /// <summary>Somebody took it in hand.</summary>
    Acknowledged,

    /// <summary>The time for which it was in hand is over.</summary>
    Reopened,

    /// <summary>A later value is back inside.</summary>
    Cleared,

    /// <summary>The entry behind it was struck out or corrected.</summary>
    ClosedByCorrection,
}
