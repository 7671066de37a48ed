namespace UnitVent.Physiology;

/// <summary>The part of ventilation that removes no carbon dioxide, as a fraction of the tidal volume.</summary>
/// <remarks>It includes apparatus and the effect of shunt. In APRV ventilation mixes releases and own breaths: there it is a dead space
/// of the whole cycle and to be labelled so.</remarks>
public static class DeadSpace
{
    private const double HighestMixedExpiredShare = 0.9;
    private const double LowestPlausible = 0.1;
    private const double HighestPlausible = 0.95;
    private const double HighestMlPerMinute = 2000; // no resting adult; catches NaN and slips of unit
    private const double Stpd = 0.863; // mmHg·L/mL: gas volumes at body temperature and saturated against standard and dry

    /// <summary>Says whether a tension can be that of mixed expired gas: at most 0.9 of the arterial, above which it is end-tidal.</summary>
    /// <remarks>Source of the limit: common practice.</remarks>
    public static bool IsMixedExpired(PartialPressure arterial, PartialPressure mixedExpired)
        => arterial != default && mixedExpired.MmHg <= HighestMixedExpiredShare * arterial.MmHg;

    /// <summary>Computes VD/VT = (PaCO2 − PECO2) / PaCO2.</summary>
    /// <remarks>Source: Enghoff H. Uppsala Läkareforen Förh 1938;44:191-218 (from memory).</remarks>
    /// <param name="arterial">Arterial carbon dioxide tension.</param>
    /// <param name="mixedExpired">Tension of mixed expired gas, which is not the end-tidal one.</param>
    /// <exception cref="ArgumentOutOfRangeException">The tension is no mixed expired one, see <see cref="IsMixedExpired"/>.</exception>
    public static double Enghoff(PartialPressure arterial, PartialPressure mixedExpired)
        => IsMixedExpired(arterial, mixedExpired)
            ? (arterial.MmHg - mixedExpired.MmHg) / Guard.Positive(arterial.MmHg, nameof(arterial))
            : throw new ArgumentOutOfRangeException(nameof(mixedExpired), "A mixed expired tension is at most 0.9 of the arterial one.");

    /// <summary>Computes VD/VT = 1 − 0.863 × VCO2 / (VE × PaCO2) from a carbon dioxide output that was not measured.</summary>
    /// <remarks>Source: Beitler JR, et al. Crit Care Med 2015;43:1026-1035 (from memory). With an output from predicted resting energy it was
    /// not associated with outcome (Morales-Quinteros L, et al. Ann Intensive Care 2019;9:128): no rule may rest on it.</remarks>
    /// <param name="carbonDioxideMlPerMin">Carbon dioxide output in mL/min STPD, in [0, 2000].</param>
    /// <param name="ventilation">Expired minute ventilation, BTPS.</param>
    /// <param name="arterial">Arterial carbon dioxide tension.</param>
    /// <returns>The unrounded fraction; negative when the three contradict each other.</returns>
    /// <exception cref="ArgumentOutOfRangeException">The output is NaN or outside its range, or another argument is 0.</exception>
    public static double FromCarbonDioxideOutput(double carbonDioxideMlPerMin, MinuteVentilation ventilation, PartialPressure arterial)
        => 1 - (AlveolarLitresPerMinute(carbonDioxideMlPerMin, arterial) / Guard.Positive(ventilation.LitresPerMinute, nameof(ventilation)));

    /// <summary>Computes the alveolar ventilation in L/min that clears an output at a tension: 0.863 × VCO2 / PaCO2.</summary>
    /// <remarks>Source: standard physiology, mass balance of carbon dioxide.</remarks>
    /// <param name="carbonDioxideMlPerMin">Carbon dioxide output in mL/min STPD, in [0, 2000].</param>
    /// <param name="arterial">Arterial carbon dioxide tension, standing for the alveolar one.</param>
    /// <returns>The unrounded ventilation; not limited to what a <see cref="MinuteVentilation"/> holds.</returns>
    /// <exception cref="ArgumentOutOfRangeException">The output is NaN or outside its range, or <paramref name="arterial"/> is 0.</exception>
    public static double AlveolarLitresPerMinute(double carbonDioxideMlPerMin, PartialPressure arterial)
        => Stpd * Guard.InRange(carbonDioxideMlPerMin, 0, HighestMlPerMinute) / Guard.Positive(arterial.MmHg, nameof(arterial));

    /// <summary>Says whether a fraction lies where a dead space can: [0.1, 0.95].</summary>
    /// <remarks>Source of the limits: common practice.</remarks>
    public static bool IsPlausible(double fraction) => fraction is >= LowestPlausible and <= HighestPlausible;
}
