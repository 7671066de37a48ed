namespace UnitVent.Physiology;

/// <summary>The rapid shallow breathing index.</summary>
public static class RapidShallowBreathing
{
    /// <summary>Computes breath rate [1/min] / tidal volume [L], in breaths/min/L.</summary>
    /// <remarks>Source: Yang KL, Tobin MJ. N Engl J Med 1991;324:1445-1450. For spontaneous breaths with little or no support;
    /// breaths at P high, with the lung inflated, do not give the published index.</remarks>
    /// <exception cref="ArgumentOutOfRangeException">The rate or the volume is 0.</exception>
    public static double Compute(BreathRate rate, GasVolume tidal)
    {
        ArgumentOutOfRangeException.ThrowIfEqual(rate, default);

        return rate.PerMinute / Guard.Positive(tidal.Litres, nameof(tidal));
    }
}
