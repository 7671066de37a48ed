namespace UnitVent.Charting.Rules.Volumes;

/// <summary>When a tidal volume counts as high for the size of the lung.</summary>
public sealed record TidalVolumeHighOptions
{
    /// <summary>Gets the tidal volume above which it is a caution.</summary>
    [Threshold("tidal volume above which it is a caution", 6, 10, Unit = "mL/kg")]
    public double CautionMlPerKg { get; init; } = 8;

    /// <summary>Gets the tidal volume above which it is urgent.</summary>
    [Threshold("tidal volume above which it is urgent", 8, 14, Unit = "mL/kg", Urgent = true)]
    public double UrgentMlPerKg { get; init; } = 10;

    /// <summary>Gets the tidal volume above which it is an advisory in ARDS.</summary>
    [Threshold("tidal volume above which it is an advisory in ARDS", 6, 8, Unit = "mL/kg", Source = "N Engl J Med 2000;342:1301-1308: 6 mL/kg")]
    public double ArdsAdvisoryMlPerKg { get; init; } = 6.5;
}
