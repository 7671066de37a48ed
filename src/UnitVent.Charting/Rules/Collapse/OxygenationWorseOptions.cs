namespace UnitVent.Charting.Rules.Collapse;

/// <summary>When oxygenation counts as worse at equal or higher mean pressure.</summary>
public sealed record OxygenationWorseOptions
{
    /// <summary>Gets the relative fall of P/F that counts as a step. The minimum important step of P/F, from the spread of repeated gases: Chest 1983;84:14.</summary>
    public double StepFall { get; init; } = 0.20;

    /// <summary>Gets how far mean pressure may have been lowered, cmH2O [common practice].</summary>
    public double MeanPressureMayFallCmH2O { get; init; } = 1;

    /// <summary>Gets the P/F from which nothing is raised, mmHg: outside the definition of JAMA 2012;307:2526.</summary>
    public double NotAbovePfMmHg { get; init; } = 300;

    /// <summary>Gets how far FiO2 may differ [common practice].</summary>
    public double FiO2Within { get; init; } = 0.10;

    /// <summary>Gets the fall of SpO2 that makes it a caution, points [common practice].</summary>
    public double SpO2FallPoints { get; init; } = 3;

    /// <summary>Gets the PaO2 under which it is urgent, mmHg [common practice].</summary>
    public double UrgentPaO2MmHg { get; init; } = 60;
}
