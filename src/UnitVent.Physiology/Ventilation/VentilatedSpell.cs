namespace UnitVent.Physiology;

/// <summary>A stretch of time on the ventilator, counted from the first intubation.</summary>
/// <param name="From">When it began, 0 or more.</param>
/// <param name="Until">When it ended, after <paramref name="From"/>.</param>
public readonly record struct VentilatedSpell(TimeSpan From, TimeSpan Until);
