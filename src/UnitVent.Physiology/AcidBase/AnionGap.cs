namespace UnitVent.Physiology;

/// <summary>The anion gap of plasma, in mmol/L, without potassium.</summary>
public static class AnionGap
{
    private const double HighestMmolPerLitre = 1000; // no plasma; catches NaN and slips of unit
    private const double NormalAlbuminGPerL = 40;
    private const double HighestAlbuminGPerL = 100;

    /// <summary>Computes sodium − chloride − bicarbonate.</summary>
    /// <remarks>Source: common practice.</remarks>
    /// <param name="sodium">Sodium in mmol/L, in [0, 1000].</param>
    /// <param name="chloride">Chloride in mmol/L, in [0, 1000].</param>
    /// <param name="bicarbonate">Bicarbonate in mmol/L, in [0, 1000].</param>
    /// <exception cref="ArgumentOutOfRangeException">A concentration is NaN or outside [0, 1000].</exception>
    public static double Compute(double sodium, double chloride, double bicarbonate)
        => Guard.InRange(sodium, 0, HighestMmolPerLitre)
            - Guard.InRange(chloride, 0, HighestMmolPerLitre)
            - Guard.InRange(bicarbonate, 0, HighestMmolPerLitre);

    /// <summary>Adds what albumin below (or above) 40 g/L hides: gap + 0.25 × (40 − albumin).</summary>
    /// <remarks>Source: Figge J, et al. Crit Care Med 1998;26:1807-1810, from memory.</remarks>
    /// <param name="gap">Anion gap in mmol/L, in [-2000, 1000].</param>
    /// <param name="albuminGPerL">Albumin in g/L, in [0, 100].</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument is NaN or outside its range.</exception>
    public static double AlbuminCorrected(double gap, double albuminGPerL)
        => Guard.InRange(gap, -2 * HighestMmolPerLitre, HighestMmolPerLitre)
            + (0.25 * (NormalAlbuminGPerL - Guard.InRange(albuminGPerL, 0, HighestAlbuminGPerL)));
}
