using System.Globalization;
using System.Runtime.CompilerServices;

namespace UnitVent.Charting.Trends;

/// <summary>The one guard of the statistics: NaN and infinity never enter.</summary>
internal static class Finite
{
    public static void Ensure(ReadOnlySpan<double> values, [CallerArgumentExpression(nameof(values))] string? name = null)
    {
        foreach (var value in values)
        {
            if (!double.IsFinite(value))
            {
                throw new ArgumentOutOfRangeException(name, string.Create(CultureInfo.InvariantCulture, $"{value} is not a finite number."));
            }
        }
    }
}
