namespace UnitVent.Physiology;

/// <summary>The ratio of oximeter saturation to inspired oxygen fraction (S/F), and the P/F it suggests.</summary>
/// <remarks>Source: Rice TW, et al. Chest 2007;132:410-417. Derived on saturations of 97 % or less, because above that
/// the dissociation curve is flat and the ratio only mirrors FiO2.</remarks>
public static class SpO2FiO2Ratio
{
    private const double HighestInformativePercent = 97;
    private const double Intercept = 64; // Rice 2007: S/F = 64 + 0.84 × P/F
    private const double Slope = 0.84;
    private const double HighestRatio = HighestInformativePercent / 0.18; // over the lowest oxygen fraction

    /// <summary>Says whether the ratio means anything at this saturation: above 0 %, at most 97 %.</summary>
    public static bool IsInformative(Saturation spO2) => spO2.Percent is >= Guard.JustAboveZero and <= HighestInformativePercent;

    /// <summary>Computes S/F: saturation in percent over oxygen fraction.</summary>
    /// <returns>The unrounded ratio.</returns>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="spO2"/> is not informative, or
    /// <paramref name="fiO2"/> is its default, 0.</exception>
    public static double Compute(Saturation spO2, OxygenFraction fiO2)
    {
        ArgumentOutOfRangeException.ThrowIfEqual(fiO2, default);

        return InformativePercent(spO2) / fiO2.Fraction;
    }

    /// <summary>Says whether the line gives a P/F above zero: S/F above 64, and not above what saturation and oxygen fraction can make it (539).</summary>
    public static bool CanImpute(double sfRatio) => sfRatio is > Intercept and <= HighestRatio;

    /// <summary>Reads P/F in mmHg from the published line: (S/F − 64) / 0.84. To be shown as imputed.</summary>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="sfRatio"/> cannot be imputed from, see <see cref="CanImpute"/>.</exception>
    public static double ImputePaO2FiO2(double sfRatio)
        => CanImpute(sfRatio)
            ? (sfRatio - Intercept) / Slope
            : throw new ArgumentOutOfRangeException(nameof(sfRatio), "P/F can be imputed only from an S/F above 64 and up to 539.");

    internal static double InformativePercent(Saturation spO2)
        => IsInformative(spO2)
            ? spO2.Percent
            : throw new ArgumentOutOfRangeException(nameof(spO2), "The saturation is informative only above 0 % and up to 97 %.");
}
