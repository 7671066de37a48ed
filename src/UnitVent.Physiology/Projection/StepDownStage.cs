namespace UnitVent.Physiology;

/// <summary>One stage of a stepwise reduction of APRV; P low and T low are those it started with.</summary>
/// <param name="High">P high.</param>
/// <param name="TimeHigh">T high.</param>
/// <param name="MeanPressure">Mean airway pressure computed from the settings.</param>
/// <param name="Rate">Releases a minute.</param>
public sealed record StepDownStage(AirwayPressure High, BreathTime TimeHigh, AirwayPressure MeanPressure, BreathRate Rate);
