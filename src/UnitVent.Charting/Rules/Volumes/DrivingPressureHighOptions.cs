namespace UnitVent.Charting.Rules.Volumes;

/// <summary>When a driving pressure counts as high: N Engl J Med 2015;372:747.</summary>
public sealed record DrivingPressureHighOptions
{
    /// <summary>Gets the driving pressure above which it is high.</summary>
    [Threshold("driving pressure above which it is high", 12, 20, Unit = "cmH2O", Source = "N Engl J Med 2015;372:747-755")]
    public double HighCmH2O { get; init; } = 15;
}
