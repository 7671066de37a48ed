namespace UnitVent.Physiology;

/// <summary>What T high and T low say about the APRV cycle.</summary>
/// <remarks>Definitions, no model. Both times must be above 0 s.</remarks>
public static class ReleaseCycle
{
    /// <summary>Computes T high + T low.</summary>
    /// <exception cref="ArgumentOutOfRangeException">A time is 0 s, or the sum exceeds 60 s.</exception>
    public static BreathTime CycleTime(BreathTime timeHigh, BreathTime timeLow)
    {
        ArgumentOutOfRangeException.ThrowIfEqual(timeHigh, default);
        ArgumentOutOfRangeException.ThrowIfEqual(timeLow, default);

        return BreathTime.FromSeconds(timeHigh.Seconds + timeLow.Seconds);
    }

    /// <summary>Computes the release rate, 60 / cycle time [s].</summary>
    /// <exception cref="ArgumentOutOfRangeException">As for <see cref="CycleTime"/>, or the cycle is shorter than 0.4 s.</exception>
    public static BreathRate Rate(BreathTime timeHigh, BreathTime timeLow)
        => BreathRate.FromPerMinute(60 / CycleTime(timeHigh, timeLow).Seconds);

    /// <summary>Computes T high / T low, the n of n:1.</summary>
    /// <exception cref="ArgumentOutOfRangeException">As for <see cref="CycleTime"/>.</exception>
    public static double Ratio(BreathTime timeHigh, BreathTime timeLow)
    {
        _ = CycleTime(timeHigh, timeLow);
        return timeHigh.Seconds / Guard.Positive(timeLow.Seconds, nameof(timeLow));
    }

    /// <summary>Computes the share of the cycle spent at P high, in percent.</summary>
    /// <exception cref="ArgumentOutOfRangeException">As for <see cref="CycleTime"/>.</exception>
    public static double ShareAtHighPercent(BreathTime timeHigh, BreathTime timeLow)
        => 100 * (timeHigh.Seconds / CycleTime(timeHigh, timeLow).Seconds);
}
