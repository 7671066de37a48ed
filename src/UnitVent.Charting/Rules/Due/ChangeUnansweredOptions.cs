namespace UnitVent.Charting.Rules.Due;

/// <summary>How large a change asks for a look, and by when [common practice].</summary>
public sealed record ChangeUnansweredOptions
{
    /// <summary>Gets the change of pressure that asks for a gas.</summary>
    [Threshold("change of pressure that asks for a gas", 1, 5, Unit = "cmH2O")]
    public double PressureCmH2O { get; init; } = 2;

    /// <summary>Gets the change of T high that asks for a gas.</summary>
    [Threshold("change of T high that asks for a gas", 0.2, 2, Unit = "s")]
    public double THighS { get; init; } = 0.5;

    /// <summary>Gets the change of T low that asks for a gas.</summary>
    [Threshold("change of T low that asks for a gas", 0.05, 0.5, Unit = "s")]
    public double TLowS { get; init; } = 0.1;

    /// <summary>Gets the change of FiO2 that asks for SpO2.</summary>
    [Threshold("change of FiO2 that asks for SpO2", 0.05, 0.3)]
    public double FiO2 { get; init; } = 0.1;

    /// <summary>Gets the hours without an answer for an advisory.</summary>
    [Threshold("hours without an answer for an advisory", 1, 6, Unit = "h")]
    public double AdvisoryHours { get; init; } = 2;

    /// <summary>Gets the hours without an answer for a caution.</summary>
    [Threshold("hours without an answer for a caution", 2, 12, Unit = "h")]
    public double CautionHours { get; init; } = 4;

    /// <summary>Gets the weaning: hours without a gas after a change.</summary>
    [Threshold("weaning: hours without a gas after a change", 4, 24, Unit = "h")]
    public double WeaningGasHours { get; init; } = 12;
}
