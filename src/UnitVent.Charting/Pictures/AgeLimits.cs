using NodaTime;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Episodes;

namespace UnitVent.Charting.Pictures;

/// <summary>How old a value may be before nothing is computed from it any more [common practice].</summary>
public sealed class AgeLimits
{
    internal AgeLimits(UnitProfile unit, VentilationMode? mode, CoursePhase phase)
    {
        Readings = unit.CheckInterval * 1.5;
        Gas = phase == CoursePhase.Weaning || mode is VentilationMode.PressureSupport or VentilationMode.Cpap ? Duration.FromHours(24) : Duration.FromHours(12);
    }

    /// <summary>Gets the limit of readings: 1.5 times the unit's check interval.</summary>
    public Duration Readings { get; }

    /// <summary>Gets the limit of gases: 12 h, or 24 h when weaning, in pressure support and in CPAP.</summary>
    public Duration Gas { get; }

    /// <summary>Gets the limit of settings since they were changed or confirmed.</summary>
    public Duration Settings { get; } = Duration.FromHours(12);
}
