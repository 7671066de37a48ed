namespace UnitVent.Physiology;

/// <summary>The release termination ratio: how much of the peak expiratory flow is left when the release ends.</summary>
/// <remarks>Source: Habashi NM. Crit Care Med 2005;33(3 Suppl):S228-S240. Higher means a shorter release and more gas kept.
/// Both flows come from the same release, taken as the mean of at least three without a visible effort.</remarks>
public static class ReleaseTermination
{
    /// <summary>Says whether the ratio is defined: a peak above 0 and an end flow below it.</summary>
    public static bool IsDefined(GasFlow peak, GasFlow end) => end.LitresPerMinute < peak.LitresPerMinute;

    /// <summary>Computes end-release flow / peak flow, in [0, 1). Zero means that flow stopped before the release ended.</summary>
    /// <exception cref="ArgumentOutOfRangeException">The ratio is not defined, see <see cref="IsDefined"/>.</exception>
    public static double Ratio(GasFlow peak, GasFlow end)
        => IsDefined(peak, end)
            ? end.LitresPerMinute / peak.LitresPerMinute
            : throw new ArgumentOutOfRangeException(nameof(end), "The end flow must be below the peak flow.");
}
