namespace UnitVent.Charting.Rules.StepDown;

/// <summary>When a step down counts as large or soon [common practice].</summary>
public sealed record LargeStepOptions
{
    /// <summary>Gets the step of P high above which it is large.</summary>
    [Threshold("step of P high above which it is large", 2, 6, Unit = "cmH2O")]
    public double LargeCmH2O { get; init; } = 3;

    /// <summary>Gets the hours since the last step under which it is soon.</summary>
    [Threshold("hours since the last step under which it is soon", 0.5, 6, Unit = "h")]
    public double SoonHours { get; init; } = 2;
}
