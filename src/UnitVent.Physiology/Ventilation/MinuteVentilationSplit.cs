namespace UnitVent.Physiology;

/// <summary>The minute ventilation in APRV split into releases and the patient's own breaths.</summary>
/// <remarks>Source: volumes add up; the 5 % allowance is common practice. A 10 % error of release volume moves a 30 % share
/// by about 7 points, so the release volume should be the mean of at least three releases.</remarks>
public static class MinuteVentilationSplit
{
    private const double AllowedExcess = 0.05;

    /// <summary>Computes release volume × release rate.</summary>
    /// <exception cref="ArgumentOutOfRangeException">The product exceeds 60 L/min.</exception>
    public static MinuteVentilation Release(GasVolume volume, BreathRate rate)
        => MinuteVentilation.FromLitresPerMinute(volume.Litres * rate.PerMinute);

    /// <summary>Says whether the release part exceeds the total by more than 5 %: then one of the readings is wrong.</summary>
    public static bool ReleaseExceedsTotal(MinuteVentilation total, MinuteVentilation release)
        => release.LitresPerMinute > total.LitresPerMinute * (1 + AllowedExcess);

    /// <summary>Derives the spontaneous part as total − release; a negative rest within measurement error is given as 0.</summary>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="total"/> is 0 L/min, or <see cref="ReleaseExceedsTotal"/>.</exception>
    public static SpontaneousShare DeriveSpontaneous(MinuteVentilation total, MinuteVentilation release)
    {
        if (ReleaseExceedsTotal(total, release))
        {
            throw new ArgumentOutOfRangeException(nameof(release), "The release part exceeds the total by more than 5 %.");
        }

        var rest = total.LitresPerMinute - release.LitresPerMinute;
        var spontaneous = MinuteVentilation.FromLitresPerMinute(Math.Max(rest, 0));
        return new(spontaneous, Share(spontaneous, total), WithinMeasurementError: rest < 0);
    }

    /// <summary>Computes spontaneous / total in percent, zero or more; above 100 when the two readings contradict each other.</summary>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="total"/> is 0 L/min.</exception>
    public static double Share(MinuteVentilation spontaneous, MinuteVentilation total)
        => 100 * (spontaneous.LitresPerMinute / Guard.Positive(total.LitresPerMinute, nameof(total)));
}
