namespace UnitVent.Physiology;

/// <summary>How long a respiratory disturbance has lasted, which decides how far the kidneys have answered. It is asked, never guessed.</summary>
public enum RespiratoryOnset
{
    /// <summary>Not known, or from 24 hours to 3 days: anything from the acute to the chronic answer is expected.</summary>
    Between,

    /// <summary>Less than 24 hours.</summary>
    Acute,

    /// <summary>More than 3 days.</summary>
    Chronic,
}
