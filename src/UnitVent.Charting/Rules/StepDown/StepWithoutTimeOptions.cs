namespace UnitVent.Charting.Rules.StepDown;

/// <summary>When a step down of P high goes with too little longer T high [common practice].</summary>
public sealed record StepWithoutTimeOptions
{
    /// <summary>Gets the step of P high that is looked at.</summary>
    [Threshold("step of P high that is looked at", 1, 5, Unit = "cmH2O")]
    public double PHighStepCmH2O { get; init; } = 2;

    /// <summary>Gets the longer T high that goes with it, for each cmH2O; half is tolerated.</summary>
    [Threshold("longer T high that goes with it, for each cmH2O; half is tolerated", 0.2, 1, Unit = "s")]
    public double THighSPerCmH2O { get; init; } = 0.5;

    /// <summary>Gets the T high from which it no longer matters.</summary>
    [Threshold("T high from which it no longer matters", 8, 20, Unit = "s")]
    public double QuietFromTHighS { get; init; } = 12;
}
