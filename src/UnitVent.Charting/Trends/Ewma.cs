namespace UnitVent.Charting.Trends;

/// <summary>An exponentially weighted moving average of dense readings with its limits: shows a small lasting shift early.</summary>
/// <remarks>
/// <para>zₜ = λ xₜ + (1 − λ) zₜ₋₁ from z₀ = target; limits target ± L σ √[λ ÷ (2 − λ)].</para>
/// <para>Source: Roberts SW. Technometrics 1959;1:239-250 [from memory]. NIST/SEMATECH e-Handbook of Statistical Methods, section 6.3.2.4. Meant for hourly readings of
/// the ventilator, not for gases.</para>
/// </remarks>
/// <param name="Averages">z₁, z₂, …, one a reading.</param>
/// <param name="Lower">The lower limit.</param>
/// <param name="Upper">The upper limit.</param>
/// <param name="FirstOutside">The index of the first average outside the limits; null when none is.</param>
public sealed record Ewma(IReadOnlyList<double> Averages, double Lower, double Upper, int? FirstOutside)
{
    /// <summary>The averages of readings, oldest first.</summary>
    /// <param name="readings">The readings; none give no averages.</param>
    /// <param name="target">The level held against, in the unit of the readings.</param>
    /// <param name="sigma">The spread of single readings, zero or more.</param>
    /// <param name="weight">λ, in (0, 1].</param>
    /// <param name="width">L, zero or more.</param>
    /// <exception cref="ArgumentOutOfRangeException">A number is not finite or outside its range.</exception>
    public static Ewma Of(ReadOnlySpan<double> readings, double target, double sigma, double weight = 0.3, double width = 3)
    {
        Finite.Ensure([target, sigma, weight, width]);
        Finite.Ensure(readings);
        ArgumentOutOfRangeException.ThrowIfNegative(sigma);
        ArgumentOutOfRangeException.ThrowIfNegative(width);
        ArgumentOutOfRangeException.ThrowIfNegativeOrZero(weight);
        ArgumentOutOfRangeException.ThrowIfGreaterThan(weight, 1);
        var reach = width * sigma * Math.Sqrt(weight / (2 - weight));
        var averages = new double[readings.Length];
        for (var i = 0; i < readings.Length; i++)
        {
            averages[i] = weight * readings[i] + (1 - weight) * (i == 0 ? target : averages[i - 1]);
        }

        var outside = Array.FindIndex(averages, z => Math.Abs(z - target) > reach);
        return new(averages, target - reach, target + reach, outside < 0 ? null : outside);
    }
}
