namespace UnitVent.Physiology;

/// <summary>What pH, PCO2 and bicarbonate look like together. A pattern of numbers, not a diagnosis.</summary>
public enum AcidBasePattern
{
    /// <summary>The three contradict each other; nothing is said of them.</summary>
    DoesNotFit,

    /// <summary>A usual pH, with at most one of the other two outside its usual range.</summary>
    Usual,

    /// <summary>A usual pH with PCO2 and bicarbonate both outside: mixed, or fully compensated.</summary>
    MixedOrCompensated,

    /// <summary>A low pH that bicarbonate explains.</summary>
    MetabolicAcidosis,

    /// <summary>A high pH that bicarbonate explains.</summary>
    MetabolicAlkalosis,

    /// <summary>A low pH that PCO2 explains.</summary>
    RespiratoryAcidosis,

    /// <summary>A high pH that PCO2 explains.</summary>
    RespiratoryAlkalosis,

    /// <summary>A low pH that both explain.</summary>
    CombinedAcidosis,

    /// <summary>A high pH that both explain.</summary>
    CombinedAlkalosis,

    /// <summary>A pH outside its usual range by less than either of the others shows.</summary>
    Unexplained,
}
