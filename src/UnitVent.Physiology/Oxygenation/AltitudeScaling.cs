namespace UnitVent.Physiology;

/// <summary>What is scaled by barometric pressure / 760 mmHg above 1000 m; the two ways answer differently.</summary>
public enum AltitudeScaling
{
    /// <summary>The limits, as in the earlier ARDS Network trials (from memory): thin air does not make a patient look sicker.</summary>
    Limits,

    /// <summary>The ratio, as the Berlin definition prints it: the same patient looks sicker in thin air.</summary>
    Ratio,
}
