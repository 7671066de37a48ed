namespace UnitVent.Charting.Trends;

/// <summary>What a movement means.</summary>
public enum DriftCourse
{
    /// <summary>There is none that stands out from chance.</summary>
    Level,

    /// <summary>For the better.</summary>
    Better,

    /// <summary>For the worse.</summary>
    Worse,

    /// <summary>It moves, and neither way is worse by itself.</summary>
    Either,
}
