namespace UnitVent.Physiology;

/// <summary>Days alive and off the ventilator in the first 28.</summary>
/// <remarks>Source: Schoenfeld DA, Bernard GR. Crit Care Med 2002;30:1772-1777 (from memory); the concept in Yehya N, et al. Am J Respir Crit
/// Care Med 2019;200:828-836. Definitions vary, so two units compare only with the same window. A measure of groups, not of a
/// patient's course.</remarks>
public static class VentilatorFreeDays
{
    private static readonly TimeSpan Horizon = TimeSpan.FromDays(28);
    private static readonly TimeSpan LongestWindow = TimeSpan.FromDays(7);

    /// <summary>Computes the free days: 28 − days ventilated in the first 28, and 0 on death within them. Elapsed time, not calendar days.</summary>
    /// <remarks>A re-intubation inside the window continues the spell before it, the gap included; known only when 28 days or the
    /// patient's life are over.</remarks>
    /// <param name="spells">Spells in order of time, apart from each other, the first beginning at 0; the last one ends at 28 days or later
    /// when the ventilator was never left.</param>
    /// <param name="reintubationWindow">How long an extubation must last to count, in [0, 7] days; 48 hours are usual.</param>
    /// <param name="death">When the patient died, counted as the spells are and not before the last one ends; null when alive after 28 days.</param>
    /// <returns>Days in [0, 28].</returns>
    /// <exception cref="ArgumentOutOfRangeException">A condition above does not hold.</exception>
    public static double Compute(IReadOnlyList<VentilatedSpell> spells, TimeSpan reintubationWindow, TimeSpan? death)
    {
        ArgumentNullException.ThrowIfNull(spells);
        ArgumentOutOfRangeException.ThrowIfLessThan(spells.Count, 1, nameof(spells));
        ArgumentOutOfRangeException.ThrowIfNotEqual(spells[0].From, TimeSpan.Zero, nameof(spells));
        ArgumentOutOfRangeException.ThrowIfLessThan(reintubationWindow, TimeSpan.Zero);
        ArgumentOutOfRangeException.ThrowIfGreaterThan(reintubationWindow, LongestWindow);
        ArgumentOutOfRangeException.ThrowIfLessThan(death ?? TimeSpan.MaxValue, spells[^1].Until, nameof(death));

        var ventilated = Ventilated(spells, reintubationWindow);
        return death <= Horizon ? 0 : (Horizon - ventilated).TotalDays;
    }

    private static TimeSpan Ventilated(IReadOnlyList<VentilatedSpell> spells, TimeSpan window)
    {
        var (total, previousEnd) = (TimeSpan.Zero, TimeSpan.Zero);
        foreach (var spell in spells)
        {
            ArgumentOutOfRangeException.ThrowIfLessThan(spell.From, previousEnd, nameof(spells));
            ArgumentOutOfRangeException.ThrowIfLessThanOrEqual(spell.Until, spell.From, nameof(spells));
            var begin = spell.From - previousEnd < window ? previousEnd : spell.From;
            total += Min(spell.Until, Horizon) - Min(begin, Horizon);
            previousEnd = spell.Until;
        }

        return total;
    }

    private static TimeSpan Min(TimeSpan a, TimeSpan b) => a < b ? a : b;
}
