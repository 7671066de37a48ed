namespace UnitVent.Charting.Entries;

/// <summary>What a pressure support is added to.</summary>
public enum PressureReference
{
    /// <summary>P high.</summary>
    PHigh,

    /// <summary>P low.</summary>
    PLow,
}
