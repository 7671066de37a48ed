namespace UnitVent.Charting.Rules.Volumes;

/// <summary>When a plateau pressure counts as high: N Engl J Med 2000;342:1301.</summary>
public sealed record PlateauHighOptions
{
    /// <summary>Gets the plateau above which it is a caution.</summary>
    [Threshold("plateau above which it is a caution", 25, 35, Unit = "cmH2O", Source = "N Engl J Med 2000;342:1301-1308")]
    public double CautionCmH2O { get; init; } = 30;

    /// <summary>Gets the plateau above which it is urgent.</summary>
    [Threshold("plateau above which it is urgent", 30, 45, Unit = "cmH2O", Urgent = true)]
    public double UrgentCmH2O { get; init; } = 35;
}
