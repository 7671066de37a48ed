namespace UnitVent.Charting.Rules;

/// <summary>How much attention a finding asks for.</summary>
public enum Severity
{
    /// <summary>Worth knowing.</summary>
    Information,

    /// <summary>Worth a look at the next round.</summary>
    Advisory,

    /// <summary>Worth a look within the hour.</summary>
    Caution,

    /// <summary>Worth a look now.</summary>
    Urgent,
}
