namespace UnitVent.Charting.Rules.Collapse;

/// <summary>When oxygenation counts as worse at equal or higher mean pressure.</summary>
public sealed record OxygenationWorseOptions
{
    /// <summary>Gets the relative fall of P/F in a step.</summary>
    [Threshold("relative fall of P/F in a step", 0.1, 0.4, Source = "Chest 1983;84:14-17: the spread of repeated gases")]
    public double StepFall { get; init; } = 0.20;

    /// <summary>Gets the relative fall of P/F in a drift.</summary>
    [Threshold("relative fall of P/F in a drift", 0.1, 0.4, Source = "Chest 1983;84:14-17: the spread of repeated gases")]
    public double TrendFall { get; init; } = 0.15;

    /// <summary>Gets how far mean pressure may have been lowered.</summary>
    [Threshold("how far mean pressure may have been lowered", 0, 3, Unit = "cmH2O")]
    public double MeanPressureMayFallCmH2O { get; init; } = 1;

    /// <summary>Gets the P/F from which nothing is raised.</summary>
    [Threshold("P/F from which nothing is raised", 200, 400, Unit = "mmHg", Source = "JAMA 2012;307:2526-2533")]
    public double NotAbovePfMmHg { get; init; } = 300;

    /// <summary>Gets how far FiO2 may differ.</summary>
    [Threshold("how far FiO2 may differ", 0.05, 0.2)]
    public double FiO2Within { get; init; } = 0.10;

    /// <summary>Gets the fall of SpO2 that makes it a caution.</summary>
    [Threshold("fall of SpO2 that makes it a caution", 2, 6, Unit = "points")]
    public double SpO2FallPoints { get; init; } = 3;

    /// <summary>Gets the PaO2 under which it is urgent.</summary>
    [Threshold("PaO2 under which it is urgent", 50, 70, Unit = "mmHg", Urgent = true)]
    public double UrgentPaO2MmHg { get; init; } = 60;
}
