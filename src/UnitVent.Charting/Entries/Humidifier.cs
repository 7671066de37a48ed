namespace UnitVent.Charting.Entries;

/// <summary>How the gas is moistened.</summary>
public enum Humidifier
{
    /// <summary>Heated humidifier.</summary>
    Heated,

    /// <summary>Heat and moisture exchanger.</summary>
    Passive,

    /// <summary>None.</summary>
    None,
}
