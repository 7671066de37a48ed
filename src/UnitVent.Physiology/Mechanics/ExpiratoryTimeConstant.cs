namespace UnitVent.Physiology;

/// <summary>The expiratory time constant from one release, and the T low that would end a release at another ratio.</summary>
/// <remarks><para>Model: one compartment empties passively; pressure steps from P high to P low at once and flow decays as
/// a single exponential. Not for obstruction, effort during the release, or an air leak.</para>
/// <para>Source: solution of the one-compartment model, as in Burke WC, et al. J Appl Physiol 1993;74:922-933.
/// A relative error of the ratio r grows by 1/ln(1/r): 3.5 times at 0.75, 1.4 times at 0.50.</para></remarks>
public static class ExpiratoryTimeConstant
{
    private const double LowestReliableRatio = 0.02;
    private const double HighestReliableRatio = 0.95;
    private const double LongestSeconds = 60; // what a BreathTime holds

    /// <summary>Says whether the ratio lies where a reading error does not swamp the result: [0.02, 0.95].</summary>
    public static bool IsReliable(double ratio) => ratio is >= LowestReliableRatio and <= HighestReliableRatio;

    /// <summary>Says whether <see cref="Compute"/> gives a value: a ratio inside (0, 1), a time above 0, a result of at most 60 s.</summary>
    public static bool IsDefined(BreathTime timeLow, double ratio)
        => timeLow != default && ratio is >= Guard.JustAboveZero and <= Guard.JustBelowOne && DecaySeconds(timeLow, ratio) <= LongestSeconds;

    /// <summary>Computes the time constant: T low / ln(1/r).</summary>
    /// <exception cref="ArgumentOutOfRangeException">The value is not defined, see <see cref="IsDefined"/>.</exception>
    public static BreathTime Compute(BreathTime timeLow, double ratio)
    {
        ArgumentOutOfRangeException.ThrowIfEqual(timeLow, default);
        Guard.InRange(ratio, Guard.JustAboveZero, Guard.JustBelowOne);

        return BreathTime.FromSeconds(DecaySeconds(timeLow, ratio));
    }

    /// <summary>Computes the T low at which flow has fallen to a target ratio: tau × ln(1/r).</summary>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="tau"/> is 0 s, <paramref name="targetRatio"/> is NaN or
    /// outside (0, 1), or the result exceeds 60 s.</exception>
    public static BreathTime TimeLowFor(BreathTime tau, double targetRatio)
    {
        ArgumentOutOfRangeException.ThrowIfEqual(tau, default);
        Guard.InRange(targetRatio, Guard.JustAboveZero, Guard.JustBelowOne);

        return BreathTime.FromSeconds(tau.Seconds * -Math.Log(targetRatio));
    }

    private static double DecaySeconds(BreathTime timeLow, double ratio) => timeLow.Seconds / -Math.Log(ratio);
}
