namespace UnitVent.Charting.Entries;

/// <summary>The unit in which gas tensions were typed.</summary>
public enum TensionUnit
{
    /// <summary>Millimetres of mercury.</summary>
    MmHg,

    /// <summary>Kilopascals.</summary>
    KPa,
}
