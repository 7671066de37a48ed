namespace UnitVent.Charting.Episodes;

/// <summary>The sex used for the lung-size formula.</summary>
public enum Sex
{
    /// <summary>Female.</summary>
    Female,

    /// <summary>Male.</summary>
    Male,
}
