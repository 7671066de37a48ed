namespace UnitVent.Store.Units;

/// <summary>What a unit is made from.</summary>
/// <param name="Code">The short code: capitals, digits, hyphens.</param>
/// <param name="Name">The name on screens and sheets.</param>
/// <param name="TimeZone">The IANA name of its time zone.</param>
/// <param name="Beds">Its beds in walking order.</param>
public sealed record NewUnit(string Code, string Name, string TimeZone, IReadOnlyList<string> Beds)
{
    /// <summary>Gets its settings.</summary>
    public UnitSettings Settings { get; init; } = new();

    /// <summary>Gets whether everything in it is invented.</summary>
    public bool IsDemo { get; init; }
}
