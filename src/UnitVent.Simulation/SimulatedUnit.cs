namespace UnitVent.Simulation;

/// <summary>An invented unit with what was charted in it.</summary>
/// <param name="Code">The short code.</param>
/// <param name="Name">The name, which says that it is invented.</param>
/// <param name="TimeZone">The zone of its clocks, by its IANA name.</param>
/// <param name="AltitudeM">Metres above the sea.</param>
/// <param name="Beds">Every bed, in walking order.</param>
/// <param name="Episodes">One for each occupied bed.</param>
public sealed record SimulatedUnit(
    string Code, string Name, string TimeZone, double AltitudeM, IReadOnlyList<string> Beds, IReadOnlyList<SimulatedEpisode> Episodes);
