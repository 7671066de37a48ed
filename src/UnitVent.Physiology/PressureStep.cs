using System.Runtime.CompilerServices;

namespace UnitVent.Physiology;

internal static class PressureStep
{
    /// <summary>Returns the step between two pressures in cmH2O, and refuses one that is not above zero.</summary>
    public static double CmH2O(
        AirwayPressure upper, AirwayPressure lower, [CallerArgumentExpression(nameof(upper))] string? name = null)
    {
        ArgumentOutOfRangeException.ThrowIfLessThanOrEqual(upper.CmH2O, lower.CmH2O, name);
        return upper.CmH2O - lower.CmH2O;
    }
}
