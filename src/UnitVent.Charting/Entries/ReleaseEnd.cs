namespace UnitVent.Charting.Entries;

/// <summary>What ends a release.</summary>
public enum ReleaseEnd
{
    /// <summary>The set T low.</summary>
    Time,

    /// <summary>A share of the peak expiratory flow.</summary>
    FlowPercent,
}
