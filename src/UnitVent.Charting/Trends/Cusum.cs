namespace UnitVent.Charting.Trends;

/// <summary>The two cumulative sums of dense readings beyond an allowance: shows when a lasting shift began.</summary>
/// <remarks>
/// <para>highₜ = max(0, highₜ₋₁ + xₜ − target − k), lowₜ = max(0, lowₜ₋₁ + target − k − xₜ), both from 0; a signal where either exceeds h.</para>
/// <para>Source: Page ES. Biometrika 1954;41:100-115 [from memory]. NIST/SEMATECH e-Handbook of Statistical Methods, section 6.3.2.3. Meant for hourly readings of the
/// ventilator, not for gases.</para>
/// </remarks>
/// <param name="High">The sums above the target, one a reading, zero or more.</param>
/// <param name="Low">The sums below the target, one a reading, zero or more.</param>
/// <param name="FirstSignal">The index of the first reading at which a sum exceeds the limit; null when none does.</param>
public sealed record Cusum(IReadOnlyList<double> High, IReadOnlyList<double> Low, int? FirstSignal)
{
    /// <summary>The sums of readings, oldest first.</summary>
    /// <param name="readings">The readings; none give no sums.</param>
    /// <param name="target">The level held against, in the unit of the readings.</param>
    /// <param name="allowance">k, half of the shift looked for, in the unit of the readings, zero or more.</param>
    /// <param name="limit">h, in the unit of the readings, zero or more.</param>
    /// <exception cref="ArgumentOutOfRangeException">A number is not finite or outside its range.</exception>
    public static Cusum Of(ReadOnlySpan<double> readings, double target, double allowance, double limit)
    {
        Finite.Ensure([target, allowance, limit]);
        Finite.Ensure(readings);
        ArgumentOutOfRangeException.ThrowIfNegative(allowance);
        ArgumentOutOfRangeException.ThrowIfNegative(limit);
        var (high, low) = (new double[readings.Length], new double[readings.Length]);
        int? signal = null;
        for (var i = 0; i < readings.Length; i++)
        {
            high[i] = Math.Max(0, (i == 0 ? 0 : high[i - 1]) + readings[i] - target - allowance);
            low[i] = Math.Max(0, (i == 0 ? 0 : low[i - 1]) + target - allowance - readings[i]);
            signal ??= Math.Max(high[i], low[i]) > limit ? i : null;
        }

        return new(high, low, signal);
    }
}
