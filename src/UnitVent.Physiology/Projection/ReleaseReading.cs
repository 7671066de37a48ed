namespace UnitVent.Physiology;

/// <summary>What was read at the bedside under one set of APRV settings and belongs to one arterial gas.</summary>
/// <param name="Settings">The settings in force when the gas was drawn.</param>
/// <param name="TerminationRatio">End-release over peak expiratory flow, mean of at least three releases without effort.</param>
/// <param name="Volume">Release volume, mean of the same releases.</param>
/// <param name="PaCO2">Arterial carbon dioxide tension, settled under the settings.</param>
/// <param name="DeadSpace">Dead space of one breath, taken to be the same for releases and own breaths.</param>
/// <param name="OwnVentilation">Minute ventilation by the patient's own breaths; 0 when there are none.</param>
/// <param name="OwnRate">Rate of the patient's own breaths; above 0 when <paramref name="OwnVentilation"/> is.</param>
public sealed record ReleaseReading(
    AprvSettings Settings,
    double TerminationRatio,
    GasVolume Volume,
    PartialPressure PaCO2,
    GasVolume DeadSpace,
    MinuteVentilation OwnVentilation,
    BreathRate OwnRate);
