namespace UnitVent.Charting.Trends;

/// <summary>What a series says about drift.</summary>
public enum DriftVerdict
{
    /// <summary>Fewer than four points, or less than four hours between first and last.</summary>
    NotEnoughData,

    /// <summary>No more order in time than chance makes.</summary>
    None,

    /// <summary>No order in time, but the last value stands off the ones before by as much as matters for a step.</summary>
    Jump,

    /// <summary>It moves one way, but by less than matters.</summary>
    SteadySmallChange,

    /// <summary>It moves one way, by as much as matters.</summary>
    Drifting,
}
