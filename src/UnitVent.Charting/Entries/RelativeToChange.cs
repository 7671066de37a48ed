namespace UnitVent.Charting.Entries;

/// <summary>Whether a gas was drawn before or after a setting change close to it.</summary>
public enum RelativeToChange
{
    /// <summary>Before the change.</summary>
    Before,

    /// <summary>After the change.</summary>
    After,
}
