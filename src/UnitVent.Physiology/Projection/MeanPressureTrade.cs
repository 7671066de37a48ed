namespace UnitVent.Physiology;

/// <summary>P high traded against T high at the same mean airway pressure.</summary>
/// <remarks><para>Solves the time-weighted mean of the two levels (<see cref="MeanAirwayPressure.Aprv"/>) for one of its terms. The
/// mean lies close to P high, so that only the first 1–2 cmH2O can be traded at all.</para>
/// <para>Source: the definition of the mean; the limits of <see cref="IsWithinLimits"/> are common practice. Every trade towards a
/// longer T high costs releases, hence carbon dioxide clearance, of which this says nothing (<see cref="AprvProjection"/>).</para></remarks>
public static class MeanPressureTrade
{
    private const double LongestCycleSeconds = 12; // 5 releases a minute
    private const double LongestSeconds = 60; // what a BreathTime holds

    /// <summary>Says whether a T high keeps the mean: P low below the mean, P high above it, and a T high of at most 60 s.</summary>
    public static bool CanKeepMean(AirwayPressure mean, AirwayPressure high, AirwayPressure low, BreathTime timeLow)
        => low.CmH2O < mean.CmH2O
            && mean.CmH2O < high.CmH2O
            && timeLow != default
            && TimeHighSeconds(mean, high, low, timeLow) <= LongestSeconds;

    /// <summary>Computes the T high that keeps a mean pressure at another P high: T low × (mean − P low) / (P high − mean).</summary>
    /// <param name="mean">The mean airway pressure to keep.</param>
    /// <param name="high">The other P high.</param>
    /// <param name="low">P low, unchanged.</param>
    /// <param name="timeLow">T low, unchanged.</param>
    /// <exception cref="ArgumentOutOfRangeException">There is none, see <see cref="CanKeepMean"/>.</exception>
    public static BreathTime TimeHigh(AirwayPressure mean, AirwayPressure high, AirwayPressure low, BreathTime timeLow)
    {
        _ = PressureStep.CmH2O(mean, low);
        _ = PressureStep.CmH2O(high, mean);
        ArgumentOutOfRangeException.ThrowIfEqual(timeLow, default);

        return BreathTime.FromSeconds(TimeHighSeconds(mean, high, low, timeLow));
    }

    /// <summary>Computes the P high that keeps a mean pressure at another T high: [mean × (T high + T low) − P low × T low] / T high.</summary>
    /// <param name="mean">The mean airway pressure to keep, above <paramref name="low"/>.</param>
    /// <param name="low">P low, unchanged.</param>
    /// <param name="timeHigh">The other T high, above 0 s.</param>
    /// <param name="timeLow">T low, unchanged, above 0 s.</param>
    /// <exception cref="ArgumentOutOfRangeException">A condition above does not hold, or the result exceeds 150 cmH2O.</exception>
    public static AirwayPressure High(AirwayPressure mean, AirwayPressure low, BreathTime timeHigh, BreathTime timeLow)
    {
        var aboveLow = PressureStep.CmH2O(mean, low);
        ArgumentOutOfRangeException.ThrowIfEqual(timeHigh, default);
        ArgumentOutOfRangeException.ThrowIfEqual(timeLow, default);

        return AirwayPressure.FromCmH2O(mean.CmH2O + (aboveLow * (timeLow.Seconds / timeHigh.Seconds)));
    }

    /// <summary>Says whether a trade may go this far: at least 5 releases a minute.</summary>
    /// <remarks>The other limit in use, a T high of 12 s, is never met first: with it and any T low there are fewer than 5.</remarks>
    /// <exception cref="ArgumentOutOfRangeException">As for <see cref="ReleaseCycle.CycleTime"/>.</exception>
    public static bool IsWithinLimits(BreathTime timeHigh, BreathTime timeLow)
        => KeepsRate(ReleaseCycle.CycleTime(timeHigh, timeLow).Seconds);

    internal static bool KeepsRate(double cycleSeconds) => cycleSeconds <= LongestCycleSeconds + Guard.Rounding;

    private static double TimeHighSeconds(AirwayPressure mean, AirwayPressure high, AirwayPressure low, BreathTime timeLow)
        => timeLow.Seconds * ((mean.CmH2O - low.CmH2O) / (high.CmH2O - mean.CmH2O));
}
