using System.Globalization;
using System.Runtime.CompilerServices;

namespace UnitVent.Physiology;

internal static class Guard
{
    /// <summary>The lower end of a range that excludes zero: below anything readable, yet too large for a quotient to overflow.</summary>
    public const double JustAboveZero = 1e-9;

    /// <summary>The upper end of a range that excludes one: the largest double below it.</summary>
    public const double JustBelowOne = 1 - (1.0 / (1L << 53));

    /// <summary>What a derived quantity may miss a limit by that it would meet without the rounding of doubles.</summary>
    public const double Rounding = 1e-9;

    /// <summary>Says whether a derived quantity lies in the closed range but for rounding; NaN never does.</summary>
    public static bool IsWithin(double value, double lowest, double highest) => value >= lowest - Rounding && value <= highest + Rounding;

    /// <summary>Returns <paramref name="value"/> when it lies in the closed range; NaN never does.</summary>
    public static double InRange(
        double value, double lowest, double highest, [CallerArgumentExpression(nameof(value))] string? name = null)
    {
        if (value >= lowest && value <= highest)
        {
            return value;
        }

        var message = string.Create(CultureInfo.InvariantCulture, $"{value} is outside [{lowest}, {highest}].");
        throw new ArgumentOutOfRangeException(name, message);
    }

    /// <summary>Returns <paramref name="value"/> when it is above zero: fit to divide by or to take the logarithm of.</summary>
    public static double Positive(double value, [CallerArgumentExpression(nameof(value))] string? name = null)
        => InRange(value, JustAboveZero, double.MaxValue, name);
}
