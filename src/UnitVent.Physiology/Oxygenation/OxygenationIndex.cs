namespace UnitVent.Physiology;

/// <summary>The oxygenation index and its oximeter form: oxygenation related to the mean pressure that buys it.</summary>
/// <remarks>Both are printed without unit. Sources: DesPrez K, et al. Chest 2017;152:1151-1158; Chen WL, et al. J Clin Med 2018;7:205.
/// The published paediatric bands are not for adults.</remarks>
public static class OxygenationIndex
{
    /// <summary>Computes OI = 100 × FiO2 × mean airway pressure [cmH2O] / PaO2 [mmHg].</summary>
    /// <returns>The unrounded index.</returns>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="fiO2"/> or <paramref name="paO2"/> is its default, 0.</exception>
    public static double Compute(OxygenFraction fiO2, AirwayPressure mean, PartialPressure paO2)
    {
        ArgumentOutOfRangeException.ThrowIfEqual(fiO2, default);

        return 100 * fiO2.Fraction * mean.CmH2O / Guard.Positive(paO2.MmHg, nameof(paO2));
    }

    /// <summary>Computes OSI = 100 × FiO2 × mean airway pressure [cmH2O] / SpO2 [%].</summary>
    /// <returns>The unrounded index.</returns>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="fiO2"/> is its default, 0, or <paramref name="spO2"/>
    /// is not informative, see <see cref="SpO2FiO2Ratio.IsInformative"/>.</exception>
    public static double ComputeFromSaturation(OxygenFraction fiO2, AirwayPressure mean, Saturation spO2)
    {
        ArgumentOutOfRangeException.ThrowIfEqual(fiO2, default);

        return 100 * fiO2.Fraction * mean.CmH2O / SpO2FiO2Ratio.InformativePercent(spO2);
    }
}
