namespace UnitVent.Charting.Bands;

/// <summary>Where a patient stands on the board.</summary>
public enum Band
{
    /// <summary>An urgent card is open.</summary>
    LookNow,

    /// <summary>A caution card is open, or something is overdue by its second limit.</summary>
    LookThisHour,

    /// <summary>Readings or gas are past their limit.</summary>
    NotKnown,

    /// <summary>The rest.</summary>
    NothingRaised,
}
