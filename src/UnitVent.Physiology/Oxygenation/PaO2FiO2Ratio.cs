namespace UnitVent.Physiology;

/// <summary>The ratio of arterial oxygen tension to inspired oxygen fraction (P/F).</summary>
public static class PaO2FiO2Ratio
{
    /// <summary>Computes P/F in mmHg.</summary>
    /// <remarks><para>P/F [mmHg] = PaO2 [mmHg] / FiO2.</para>
    /// <para>Source: ARDS Definition Task Force, JAMA 2012;307:2526-2533. It depends on FiO2 and on mean airway pressure
    /// (Karbing DS, et al. Crit Care 2007;11:R118), so two values compare only with both beside them.</para></remarks>
    /// <param name="paO2">Arterial oxygen tension; a venous or capillary tension has no place here.</param>
    /// <param name="fiO2">Oxygen fraction in force when the sample was drawn.</param>
    /// <returns>The unrounded ratio in mmHg.</returns>
    /// <exception cref="ArgumentOutOfRangeException">An argument is its default, 0.</exception>
    public static double Compute(PartialPressure paO2, OxygenFraction fiO2)
    {
        ArgumentOutOfRangeException.ThrowIfEqual(paO2, default);
        ArgumentOutOfRangeException.ThrowIfEqual(fiO2, default);

        return paO2.MmHg / fiO2.Fraction;
    }
}
