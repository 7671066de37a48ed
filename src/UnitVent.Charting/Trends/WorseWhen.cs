namespace UnitVent.Charting.Trends;

/// <summary>Which way a quantity gets worse.</summary>
public enum WorseWhen
{
    /// <summary>When it falls.</summary>
    Falling,

    /// <summary>When it rises.</summary>
    Rising,

    /// <summary>When it moves away from its normal value.</summary>
    LeavingNormal,

    /// <summary>Neither way is worse by itself; both are worth a look.</summary>
    Either,
}
