namespace UnitVent.Charting.Episodes;

/// <summary>How an episode ended.</summary>
public enum Outcome
{
    /// <summary>Off the ventilator.</summary>
    Liberated,

    /// <summary>Off the ventilator with a tracheostomy.</summary>
    TracheostomyWeaned,

    /// <summary>Moved to another unit or hospital.</summary>
    Transferred,

    /// <summary>Died.</summary>
    Died,

    /// <summary>Admitted by mistake.</summary>
    CancelledInError,
}
