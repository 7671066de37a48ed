namespace UnitVent.Charting.Entries;

/// <summary>Where blood was drawn from.</summary>
public enum Specimen
{
    /// <summary>An artery.</summary>
    Arterial,

    /// <summary>A vein.</summary>
    Venous,

    /// <summary>A capillary.</summary>
    Capillary,
}
