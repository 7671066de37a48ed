using NodaTime;
using UnitVent.Charting.Entries;

namespace UnitVent.Store.Units;

/// <summary>What of a unit may be changed at any time.</summary>
public sealed record UnitSettings
{
    /// <summary>Gets the altitude in metres, −430 to 6000.</summary>
    public double AltitudeM { get; init; }

    /// <summary>Gets the unit in which tensions are shown.</summary>
    public TensionUnit TensionUnit { get; init; } = TensionUnit.MmHg;

    /// <summary>Gets the method by which releases are set unless a patient has another.</summary>
    public SettingMethod Method { get; init; } = SettingMethod.FixedRate;

    /// <summary>Gets how often a ventilator check is due, 1 to 12 h.</summary>
    public Duration CheckInterval { get; init; } = Duration.FromHours(4);

    /// <summary>Gets the times at which shifts begin.</summary>
    public IReadOnlyList<LocalTime> ShiftStarts { get; init; } = [new LocalTime(7, 0), new LocalTime(19, 0)];
}
