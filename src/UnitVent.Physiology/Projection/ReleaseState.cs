namespace UnitVent.Physiology;

/// <summary>The steady state of releases under one set of settings.</summary>
/// <param name="Volume">Release volume.</param>
/// <param name="Rate">Releases a minute.</param>
/// <param name="MeanPressure">Mean airway pressure computed from the settings.</param>
/// <param name="TerminationRatio">End-release over peak expiratory flow, in (0, 1).</param>
/// <param name="AlveolarVentilation">Ventilation beyond the dead space, by releases and own breaths together.</param>
public sealed record ReleaseState(
    GasVolume Volume,
    BreathRate Rate,
    AirwayPressure MeanPressure,
    double TerminationRatio,
    MinuteVentilation AlveolarVentilation);
