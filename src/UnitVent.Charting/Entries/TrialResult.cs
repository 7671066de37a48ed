namespace UnitVent.Charting.Entries;

/// <summary>How a breathing trial ended.</summary>
public enum TrialResult
{
    /// <summary>Passed.</summary>
    Passed,

    /// <summary>Failed.</summary>
    Failed,

    /// <summary>Not done.</summary>
    NotDone,
}
