namespace UnitVent.Physiology;

/// <summary>The two pressures and two times of APRV, in force or considered.</summary>
/// <param name="High">P high, above atmospheric pressure.</param>
/// <param name="Low">P low, below <paramref name="High"/> for every equation that takes the pair.</param>
/// <param name="TimeHigh">T high, above 0 s.</param>
/// <param name="TimeLow">T low, above 0 s.</param>
public readonly record struct AprvSettings(AirwayPressure High, AirwayPressure Low, BreathTime TimeHigh, BreathTime TimeLow);
