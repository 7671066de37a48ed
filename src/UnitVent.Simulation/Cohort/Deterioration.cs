namespace UnitVent.Simulation.Cohort;

/// <summary>What is planted in a simulated patient: one of eight ways to slip.</summary>
public enum Deterioration
{
    /// <summary>T low is doubled.</summary>
    ReleaseLengthened,

    /// <summary>Compliance falls by 40 % in 10 h.</summary>
    ComplianceFalling,

    /// <summary>Own breathing falls by 75 % in 8 h while T high is longer.</summary>
    OwnBreathingFading,

    /// <summary>Shunt rises by 0.13 in 9 h.</summary>
    ShuntRising,

    /// <summary>Resistance rises to 2.3 times in 8 h.</summary>
    ResistanceRising,

    /// <summary>Sedation deepens to RASS −4 within an hour and own breathing is gone.</summary>
    DeepSedation,

    /// <summary>One gas is charted with a bicarbonate 7 mmol/L off.</summary>
    BicarbonateSlip,

    /// <summary>A lung falls together within minutes.</summary>
    Pneumothorax,
}
