using NodaTime;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Rules;

namespace UnitVent.Charting.Episodes;

/// <summary>What of a unit shapes how its charts are read.</summary>
/// <param name="Id">The unit's id.</param>
/// <param name="Code">The short code, for example <c>DEMO</c>.</param>
/// <param name="Name">The name on screens and sheets.</param>
/// <param name="Zone">The time zone of its clocks.</param>
public sealed record UnitProfile(Guid Id, string Code, string Name, DateTimeZone Zone)
{
    /// <summary>Gets the altitude in metres, −430 to 6000.</summary>
    public double AltitudeM { get; init; }

    /// <summary>Gets the unit in which tensions are shown.</summary>
    public TensionUnit TensionUnit { get; init; } = TensionUnit.MmHg;

    /// <summary>Gets the method by which releases are set unless a patient has another.</summary>
    public SettingMethod Method { get; init; } = SettingMethod.FixedRate;

    /// <summary>Gets how often a ventilator check is due.</summary>
    public Duration CheckInterval { get; init; } = Duration.FromHours(4);

    /// <summary>Gets how far back drift is looked for, 6–48 h.</summary>
    public Duration DriftWindow { get; init; } = Duration.FromHours(24);

    /// <summary>Gets the times at which shifts begin, in order.</summary>
    public IReadOnlyList<LocalTime> ShiftStarts { get; init; } = [new LocalTime(7, 0), new LocalTime(19, 0)];

    /// <summary>Gets whether everything in it is invented.</summary>
    public bool IsDemo { get; init; }

    /// <summary>Gets the beds, in walking order.</summary>
    public IReadOnlyList<string> Beds { get; init; } = [];

    /// <summary>Gets the thresholds of the rules.</summary>
    public RuleThresholds Thresholds { get; init; } = new();
}
